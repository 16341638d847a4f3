import { expect, test } from "vitest";
import { GOVERNING } from "../../src/cli/governing.ts";

test("GOVERNING has the rules with a level or a time, and none on what comes back", () => {
  expect(GOVERNING).toEqual(
    expect.arrayContaining(["iec-60204-residual", "nfpa-70e-360", "nec-460-6", "iec-61010-plug"]),
  );
  expect(GOVERNING.filter((id) => id.startsWith("absorption"))).toEqual([]);
});
