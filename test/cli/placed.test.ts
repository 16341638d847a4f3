import { expect, test } from "vitest";
import { placedBank } from "../../src/cli/placed.ts";
import { fakePorts } from "../support/fakePorts.ts";
import { SMALL } from "../support/placeCli.ts";

const FLAGS = { series: "3", parallel: "2", ties: "cross-tied", measured: "m.csv" };
const placed = (flags = {}) => {
  const read = placedBank(undefined, { ...FLAGS, ...flags }, fakePorts({ "m.csv": SMALL }));
  if (!read.ok) throw new Error();
  return read.value;
};

test("placedBank: the course needs voltage and leakage; resistors of a third and three times are tried beside", () => {
  expect(placed()).toMatchObject({ course: null, resistors: null, front: null, mending: null });
  const known = placed({ voltage: "1 kV", balance: "100 kohm", leakageAt: "360 V" });
  expect(known.course?.charging.voltage).toBeCloseTo(1000 * known.placing.charging.worst, 9);
  expect(known.course?.holding.voltage).toBeCloseTo(1000 * (known.placing.holding?.worst ?? 0), 6);
  expect(known.resistors?.map((row) => row.resistance)).toEqual([Number.POSITIVE_INFINITY, 3e5, 1e5, 1e5 / 3]);
  expect(known.spares.size).toBe(6);
  expect(known.positions.length).toBe(7);
});
