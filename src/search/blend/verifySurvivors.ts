// The second half of the verifier: tries every blend of survivors. It shares no code with the search.
import type { BlendCertificate } from "./certificate.ts";
import type { BlendModel, BlendOption } from "./model.ts";

/** Costs are whole, so a bound this little above cost - 1 still proves the cost. */
export const WHOLE_SLACK = 1e-3;

/** A string type with its amounts as fractions of the limits, and the counts worth having. */
export interface VerifyColumn {
  readonly option: BlendOption;
  readonly amounts: readonly number[];
  readonly last: number;
  readonly gain: number;
  /** Its part of the shipments it needs. */
  readonly share: number;
}

/** Tries every blend of survivors that the bound does not rule out, the cheapest-looking options first. */
export function trySurvivors(
  model: BlendModel,
  certificate: BlendCertificate,
  columns: readonly VerifyColumn[],
  threshold: number,
  offset: number,
  work: number,
): "none" | "cheaper" | "unsettled" {
  const open = certificate.survivors
    .filter(({ strings }) => strings.length > 0)
    .map(({ option, strings }) => {
      const column = columns[option]!;
      const pairs = strings.map((x) => ({ x, reduced: column.option.costs[x]! + column.share - column.gain * x }));
      pairs.sort((a, b) => a.reduced - b.reduced);
      return { column, pairs, least: pairs[0]!.reduced };
    })
    .sort((a, b) => a.least - b.least);
  const limit = threshold - 1 + WHOLE_SLACK;
  let spent = 0;
  let cheaper = false;
  const parts: number[] = [];
  const chosen: BlendOption[] = [];
  const sent = (): number => {
    const senders = new Set(chosen.flatMap(({ suppliers = [] }) => suppliers));
    return [...senders].reduce((sum, supplier) => sum + model.shipments![supplier]!, 0);
  };
  const go = (from: number, types: number, cost: number, reduced: number, sums: readonly number[]): void => {
    if (sums[0]! >= 1) {
      if (cost + sent() <= limit && sums.every((sum, row) => row === 0 || sum <= 1)) cheaper = true;
      return;
    }
    if (types === 0) return;
    for (let at = from; at < open.length && !cheaper && spent <= work; at += 1) {
      const { column, pairs, least } = open[at]!;
      let rest = 0;
      for (let i = at + 1; i < Math.min(open.length, at + types); i += 1) rest += Math.min(0, open[i]!.least);
      if (offset + reduced + least + rest > limit) return;
      if (parts.includes(column.option.partIndex)) continue;
      parts.push(column.option.partIndex);
      chosen.push(column.option);
      for (const pair of pairs) {
        if (offset + reduced + pair.reduced + rest > limit) break;
        spent += 1;
        const next = sums.map((sum, row) => sum + column.amounts[row]! * pair.x);
        if (next.some((sum, row) => row > 0 && sum > 1)) continue;
        go(at + 1, types - 1, cost + column.option.costs[pair.x]!, reduced + pair.reduced, next);
      }
      parts.pop();
      chosen.pop();
    }
  };
  go(0, model.maxTypes, 0, 0, [0, 0, 0, 0]);
  if (cheaper) return "cheaper";
  return spent > work ? "unsettled" : "none";
}
