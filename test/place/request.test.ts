import { describe, expect, test } from "vitest";
import { checkRequest, type PlaceRequest } from "../../src/place/request.ts";
import { units } from "./lots.ts";

const asked: PlaceRequest = { series: 2, parallel: 3, ties: "cross-tied" };
const codes = (lot: Parameters<typeof checkRequest>[0], request: PlaceRequest): string[] => {
  const read = checkRequest(lot, request);
  return read.ok ? [] : read.refusals.map((r) => r.code);
};

describe("checkRequest(units, request)", () => {
  const lot = units("uniform", 6, 1);
  test("a sound request passes", () => expect(codes(lot, asked)).toEqual([]));
  test("shape, numbers and counts", () => {
    expect(codes(lot, { ...asked, series: 0 })).toEqual(["place.shape"]);
    expect(codes(lot, { ...asked, parallel: 2.5 })).toEqual(["place.shape"]);
    expect(codes(lot, { ...asked, series: 3 })).toEqual(["place.too-few"]);
    expect(codes(lot, { ...asked, uncertainty: -1 })).toEqual(["place.number"]);
    expect(codes(lot, { ...asked, leakageVoltage: 0 })).toEqual(["place.number"]);
  });
  test("every fault of the units is told: a serial twice, a capacitance of zero, a negative leakage", () => {
    const bad = lot.with(1, lot[0]!).with(2, { serial: "z", capacitance: 0, leakage: -1 });
    expect(codes(bad, asked)).toEqual(["place.duplicate-serial", "place.capacitance", "place.leakage"]);
    expect(codes(lot.with(0, { serial: "n", capacitance: Number.NaN }), asked)).toEqual(["place.capacitance"]);
  });
  test("pins: unknown serial, group out of range, a unit twice, more than a stage holds", () => {
    const pin = (serial: string, group: number) => ({ serial, group });
    expect(codes(lot, { ...asked, pins: [pin("X", 0)] })).toEqual(["place.pin-unknown"]);
    expect(codes(lot, { ...asked, pins: [pin("U001", 2)] })).toEqual(["place.pin-group"]);
    expect(codes(lot, { ...asked, pins: [pin("U001", 0), pin("U001", 1)] })).toEqual(["place.pin-twice"]);
    const four = ["U001", "U002", "U003", "U004"].map((serial) => pin(serial, 1));
    expect(codes(lot, { ...asked, pins: four })).toEqual(["place.pin-full"]);
  });
  test("rooms: a group that no unit is of, a stage that is not there, two groups for one stage", () => {
    const tall = lot.map((unit) => ({ ...unit, group: "tall" }));
    const room = (group: number, takes: string) => ({ group, takes });
    expect(codes(tall, { ...asked, rooms: [room(0, "tall"), room(1, "tall")] })).toEqual([]);
    expect(codes(lot, { ...asked, rooms: [room(0, "tall")] })).toEqual(["place.room-unknown"]);
    expect(codes(tall, { ...asked, rooms: [room(2, "tall")] })).toEqual(["place.room-group"]);
    expect(codes(tall, { ...asked, rooms: [room(1, "tall"), room(1, "tall")] })).toEqual(["place.room-twice"]);
  });
});
