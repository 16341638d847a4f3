import { expect, test } from "vitest";
import { NO_PATH, pathTimes } from "../../src/pulse/busPath.ts";

test("pathTimes(path, factor) scales resistance and inductance alike; nothing stays nothing", () => {
  expect(pathTimes({ resistance: 2, inductance: 3e-9 }, 0.5)).toEqual({ resistance: 1, inductance: 1.5e-9 });
  expect(pathTimes(NO_PATH, 7)).toEqual(NO_PATH);
});
