// What a blend is chosen from: string types with tabulated purchase costs, the need, and the ceilings.

/**
 * A lower bound on a cost table that is known without building it: for every x >= 1, costs[x] is at least
 * fixed + perString x, and at least `least`, which as a rule is what one string costs with its packs and minimum order.
 */
export interface CostFloor {
  readonly fixed: number;
  readonly perString: number;
  readonly least?: number;
}

/** One kind of string (a part, its series count, its ties and resistors). */
export interface BlendOption {
  /** Basis capacitance of one string, F, > 0. */
  readonly capacity: number;
  /** Volume of one string, m3, >= 0. */
  readonly volume: number;
  /** Mass of one string, kg, >= 0. */
  readonly mass: number;
  /** Units in one string, a whole number >= 1. */
  readonly units: number;
  /** Most strings that can be had, a whole number >= 0. */
  readonly maxStrings: number;
  /**
   * Cheapest purchase for x strings, whole minor units of money (cents), index 0 to maxStrings; costs[0] = 0, never
   * falling. It may be a getter that builds the table when first read; then give `floor` too.
   */
  readonly costs: Float64Array;
  readonly floor?: CostFloor;
  /** Which part the string is made of. A blend uses each part in at most one way, for two ways would share its stock. */
  readonly partIndex: number;
  /** Who must send something once a string of it is in the blend: places in the model's shipments, each once. Absent: nobody. */
  readonly suppliers?: readonly number[];
}

/** Upper limits on the whole bank: m3, kg, number; Infinity where there is none. */
export interface BlendCeilings {
  readonly volume: number;
  readonly mass: number;
  readonly units: number;
}

export interface BlendModel {
  readonly options: readonly BlendOption[];
  /** Capacitance that the bank must have, F, > 0. */
  readonly requirement: number;
  readonly ceilings: BlendCeilings;
  /** Most string types in one bank, a whole number >= 1. */
  readonly maxTypes: number;
  /** What a shipment of each supplier costs, whole minor units of money, charged once a blend. Absent: none costs anything. */
  readonly shipments?: readonly number[];
}

/** So many strings of one option, named by its place in `options`. */
export interface BlendCount {
  readonly option: number;
  readonly strings: number;
}

/** Relative slack of every comparison with the need or a ceiling, so that an exact fit is a fit. Shared by all engines. */
export const FIT_TOLERANCE = 1e-9;

/** No table may go above this, so that sums of costs stay exact whole numbers. */
export const LARGEST_COST = 1e11;

const isCount = (value: number, least: number): boolean => Number.isSafeInteger(value) && value >= least;
const isAmount = (value: number): boolean => Number.isFinite(value) && value >= 0;

function costFault(costs: Float64Array, maxStrings: number): string | null {
  if (costs.length < maxStrings + 1) return "its cost table is shorter than maxStrings + 1";
  if (costs[0] !== 0) return "no strings must cost 0";
  for (let x = 1; x <= maxStrings; x += 1) {
    const cost = costs[x]!;
    if (!isCount(cost, 0) || cost > LARGEST_COST) return `the cost of ${x} strings is not a whole number up to 1e11`;
    if (cost < costs[x - 1]!) return `${x} strings cost less than ${x - 1}`;
  }
  return null;
}

function optionFault(option: BlendOption): string | null {
  if (!Number.isFinite(option.capacity) || option.capacity <= 0) return "its capacity is not above zero";
  if (!isAmount(option.volume)) return "its volume is unknown or negative";
  if (!isAmount(option.mass)) return "its mass is unknown or negative";
  if (!isCount(option.units, 1)) return "its units are not a whole number above zero";
  if (!isCount(option.maxStrings, 0)) return "its maxStrings is not a whole number";
  return costFault(option.costs, option.maxStrings);
}

function supplierFault({ suppliers = [] }: BlendOption, shipments: readonly number[]): string | null {
  if (new Set(suppliers).size < suppliers.length) return "it names a supplier twice";
  return suppliers.every((one) => shipments[one] !== undefined) ? null : "it names a supplier without a shipment";
}

/** Everything that makes a model unusable, one sentence each; empty when it is sound. Builds every cost table. */
export function blendModelFaults(model: BlendModel): readonly string[] {
  const faults: string[] = [];
  if (!Number.isFinite(model.requirement) || model.requirement <= 0) faults.push("the requirement is not above zero");
  if (!isCount(model.maxTypes, 1)) faults.push("maxTypes is not a whole number above zero");
  for (const [name, value] of Object.entries(model.ceilings)) {
    if (Number.isNaN(value) || value < 0) faults.push(`the ceiling on ${name} is unknown or negative`);
  }
  const { shipments = [] } = model;
  if (!shipments.every((cost) => isCount(cost, 0) && cost <= LARGEST_COST))
    faults.push("the cost of a shipment is not a whole number up to 1e11");
  model.options.forEach((option, index) => {
    const fault = optionFault(option) ?? supplierFault(option, shipments);
    if (fault !== null) faults.push(`option ${index}: ${fault}`);
  });
  return faults;
}
