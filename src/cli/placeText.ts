// A placing as text for people: the shares and what is proven, where each unit goes, the spares, the findings.

import { visible } from "../order/index.ts";
import { formatQuantity } from "../quantity/index.ts";
import { findingsText, hanging } from "./layoutText.ts";
import type { Placed } from "./placed.ts";
import { frontText, mendingText, resistorsText } from "./placeMoreText.ts";
import { refusalWords } from "./words.ts";
import { bullet, wrap } from "./wrap.ts";

/** A gap in parts per million below a tenth of a per cent, in per cent above. */
export const gapWords = (gap: number): string => {
  if (gap === 0) return "0 ppm";
  if (gap >= 1e-3) return formatQuantity(gap, "fraction", { digits: 3, rounding: "up" });
  return gap < 1e-8 ? "under 0.01 ppm" : `${formatQuantity(gap * 1e6, "count", { digits: 3, rounding: "up" })} ppm`;
};

const BOUNDS: Readonly<Record<string, string>> = {
  exhaustive: "every better placing was ruled out",
  "even share": "nothing shares better than evenly",
};

function chargingWords({ placing, input }: Placed): string {
  const { charging, digits } = placing;
  const { voltage } = input.bank;
  const share = formatQuantity(charging.worst, "fraction", { digits });
  const volts = voltage === null ? "" : `, ${formatQuantity(voltage * charging.worst, "voltage", { digits })}`;
  const doubt = formatQuantity(charging.plusMinus, "fraction", { digits: 2, rounding: "up" });
  return `worst at ${share} of the bank${volts}, +-${doubt} by the meter; ${gapWords(charging.gap)} above an even share`;
}

function proofWords({ charging, floor }: Placed["placing"]): string {
  const why = BOUNDS[charging.boundKind] ?? `by the bound of ${charging.boundKind}`;
  const proof =
    charging.proof === "optimal"
      ? `proven optimal: ${why}`
      : `within ${gapWords(charging.certified)} of the best possible, which is not below ${gapWords(charging.lowerBound)} (${why})`;
  const telling = floor === 0 ? "" : `. The meter cannot tell gaps below ${gapWords(floor)}`;
  return `${proof}${telling}`;
}

function holdingWords({ placing, course, input }: Placed): string {
  const { holding } = placing;
  if (holding === null) return "not assessed: see the findings";
  const { voltage, resistance } = input.bank;
  const volts = voltage === null ? "" : `, ${formatQuantity(voltage * holding.worst, "voltage", { digits: 3 })}`;
  const with_ = resistance === null ? "without resistors" : `with ${formatQuantity(resistance, "resistance")}`;
  const share = formatQuantity(holding.worst, "fraction", { digits: 3 });
  const end = `worst at ${share}${volts} after an endless hold ${with_}; ${gapWords(holding.gap)} above an even share`;
  if (course === null) return end;
  const { peak, above, holding: held } = course;
  const top = formatQuantity(peak.voltage, "voltage", { digits: 4, rounding: "up" });
  return above > 1e-6
    ? `${end}. Between the two ends ${top} after ${formatQuantity(peak.seconds, "time", { digits: 3 })}, ${gapWords(above)} above the higher end`
    : `${end}. From the end of the charge to the end of the hold${Number.isFinite(held.seconds) ? ` of ${formatQuantity(held.seconds, "time", { digits: 3 })}` : ""} nothing stands higher than ${top}, the meter's doubt left out`;
}

/** One line a group: its number and its serials. */
function groupsText({ placing }: Placed, width: number): string {
  const name = placing.ties === "cross-tied" ? "stage" : "string";
  return placing.groups.map((group, g) => hanging(`${name} ${g + 1}`, group.map(visible).join("  "), width)).join("\n");
}

export function placeText(placed: Placed, width: number): string {
  const { placing, input, notes, findings } = placed;
  const { ties, series, parallel, spares } = placing;
  const shape =
    ties === "cross-tied"
      ? `${series} stages of ${parallel} units, cross-tied`
      : `${parallel} strings of ${series} units in series`;
  const saved = savedWords(placed);
  const facts = [
    hanging("charging", chargingWords(placed), width),
    hanging("", proofWords(placing), width),
    hanging("holding", holdingWords(placed), width),
    ...(saved === null ? [] : [hanging("measuring saved", saved, width)]),
  ];
  const blocks = [
    wrap(`${shape}: ${series * parallel} of ${input.units.length} measured units placed`, width),
    facts.join("\n"),
    `Positions\n${groupsText(placed, width)}${spares.length === 0 ? "" : `\n${hanging("spares", spares.map(visible).join("  "), width)}`}`,
    `Findings\n${findingsText(findings, width)}`,
    resistorsText(placed, width),
    frontText(placed, width),
    mendingText(placed, width),
    ...input.measured.faults.map((fault) => wrap(`Not placed, ${refusalWords(fault)}`, width)),
    ...notes.map((note) => wrap(note, width)),
    `Cautions\n${bullet("This is a calculation, not an approval. Read every stage at a low voltage first: joulewright commission.", width)}`,
  ];
  return `${blocks.filter((block) => block !== "").join("\n\n")}\n`;
}

/** What the worst case of the tolerance would have had to allow for. */
function savedWords({ placing, input }: Placed): string | null {
  const worst = input.assessed?.share.charging ?? null;
  const { voltage } = input.bank;
  if (worst === null || voltage === null || placing.series === 1) return null;
  const show = (x: number): string => formatQuantity(x, "voltage", { digits: 4 });
  return `the worst case of the tolerance is ${show(worst)} on a unit while charging; measured and placed it is ${show(voltage * placing.charging.worst)}`;
}
