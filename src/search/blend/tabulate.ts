// Turns a purchase price of q units into the cost table of an option, x strings at a time.
import type { BlendOption, CostFloor } from "./model.ts";

/** How one kind of string is bought. */
export interface StringPurchase {
  /** Cheapest purchase of at least q units, whole minor units of money; null when q cannot be had. */
  readonly purchase: (units: number) => number | null;
  /** Units and resistors in one string. */
  readonly unitsPerString: number;
  readonly resistorsPerString: number;
  /** Cheapest purchase of at least q resistors; null when q cannot be had. */
  readonly resistorPurchase: (resistors: number) => number | null;
  /** Charged once when any string of this kind is bought (a line, a set-up), whole minor units. */
  readonly fixed: number;
  /** No need to tabulate beyond this. */
  readonly mostStrings: number;
}

/**
 * Cost of 0 to X strings, where X is the last count that can be had, at most `mostStrings`.
 * A price list under which more strings cost less (a contradiction once "at least q" is meant) is levelled from above:
 * whoever wants few may buy many.
 */
export function tabulateCosts(how: StringPurchase): Float64Array {
  const costs: number[] = [0];
  for (let x = 1; x <= how.mostStrings; x += 1) {
    const units = how.purchase(how.unitsPerString * x);
    const resistors = how.resistorsPerString === 0 ? 0 : how.resistorPurchase(how.resistorsPerString * x);
    if (units === null || resistors === null) break;
    costs.push(how.fixed + units + resistors);
  }
  for (let x = costs.length - 2; x >= 1; x -= 1) costs[x] = Math.min(costs[x]!, costs[x + 1]!);
  return Float64Array.from(costs);
}

/** The facts of an option that are known without its table. */
export type OptionFacts = Omit<BlendOption, "costs" | "floor">;

/** An option whose table is built when first read; `floor` must hold for every count, for the search trusts it. */
export function lazyOption(facts: OptionFacts, floor: CostFloor, build: () => Float64Array): BlendOption {
  let table: Float64Array | undefined;
  return {
    ...facts,
    floor,
    get costs() {
      table ??= build();
      return table;
    },
  };
}
