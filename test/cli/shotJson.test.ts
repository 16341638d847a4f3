import { expect, test } from "vitest";
import { shotJson } from "../../src/cli/shotJson.ts";
import { inductanceSweep, shotOf } from "../../src/search/index.ts";
import { FILM, shotBrief, shotLayout } from "../support/shotBank.ts";

test("shotJson(layout, report): the figures stand at the top, and the energies beside them", () => {
  const brief = shotBrief();
  const layout = shotLayout(brief);
  const shot = shotOf({ layout, unit: FILM, brief });
  if (!shot.ok) throw new Error("the shot must be");
  const { discharge } = shot.value;
  const { damping, peakCurrent, peakTime, reversal, action, unitPeakCurrent, energy } = discharge;
  const sweep = inductanceSweep({ layout, unit: FILM, brief }, 5);
  expect(shotJson(layout, shot.value, null).sweep).toBeNull();
  expect(shotJson(layout, shot.value, sweep).sweep).toBe(sweep);
  expect(shotJson(layout, shot.value, sweep)).toMatchObject({
    ...{ id: layout.id, part: "film", series: 1, parallel: 1, damping, peakCurrent, peakTime },
    ...{ reversal, action, unitPeakCurrent, energy, bus: { known: true } },
  });
});
