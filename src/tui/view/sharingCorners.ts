// The corner behind each worst case, in volts and words, or what is unknown.
import { type CornerFact, heldWords, type LayoutResult } from "../../search/index.ts";
import type { RestDetail } from "../ports.ts";
import { type Row, rowOf, span } from "../row.ts";
import { fitText, wrapText } from "../text.ts";
import { shown, shownWorst } from "../values.ts";

const LABEL = 16;

/** A label and words that hang beside it. */
export function hangingRows(label: string, words: string, columns: number): readonly Row[] {
  return wrapText(words, Math.max(8, columns - LABEL)).map((line, index) =>
    rowOf(span(fitText(index === 0 ? label : "", LABEL), "quiet"), span(line)),
  );
}

/** `held` is the worst end of an endless hold: where it starts highest it falls to that. */
function whenWords(hold: number, held: number | null): string {
  if (hold === 0)
    return held === null ? "at its start" : `at its start, and at most ${shownWorst(held, "voltage")} later`;
  return hold === Number.POSITIVE_INFINITY ? "in the end" : `after ${shown(hold, "time")}`;
}

/** Why a worst case is missing. */
export const unknownWords = ({ tolerance }: Pick<RestDetail, "tolerance">): string =>
  tolerance === null
    ? "not assessed: the tolerance of the unit is unknown"
    : "not assessed: the leakage of the unit is unknown";

export function cornerRows(
  { series, share }: LayoutResult,
  rest: RestDetail,
  columns: number,
  endless: boolean,
): readonly Row[] {
  if (series === 1)
    return hangingRows("corners", "one in series: its voltage is the bank's, nothing is shared", columns);
  const { charging, holding, dumped, dumpedFromHold } = rest.corners;
  const row = (label: string, fact: CornerFact | null, when: string): readonly Row[] => {
    if (fact === null) return hangingRows(label, unknownWords(rest), columns);
    const volts = fact.voltage < 0 ? shown(fact.voltage, "voltage") : shownWorst(fact.voltage, "voltage");
    return hangingRows(label, `${volts}${when === "" ? "" : ` ${when}`}: ${fact.words}`, columns);
  };
  const worse = dumpedFromHold !== null && dumped !== null && dumpedFromHold.voltage < dumped.voltage;
  return [
    ...row("charging", charging, ""),
    ...row("holding", holding, holding === null ? "" : whenWords(holding.hold, endless ? share.holding : null)),
    ...row("after a dump", dumped, "from equal sharing"),
    ...(worse ? row("", dumpedFromHold, `from ${heldWords(dumpedFromHold.hold)}`) : []),
  ];
}
