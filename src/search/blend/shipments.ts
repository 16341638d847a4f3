// What is paid once for each supplier that a blend buys from; and the model in which every string type bears a share of it.
//
// | symbol | in code   | unit        |
// | ------ | --------- | ----------- |
// | F_s    | shipments | minor units |
// | k_s    | sharers   | 1           |
//
// At most k_s = min(most types, parts of supplier s) string types can share one shipment, so charging each of them
// floor(F_s / k_s) never charges a blend more than it pays: every bound on the shared model bounds the true cost.
// Source: [methods-derived] a fixed charge split over the columns that can share it.
import type { BlendModel, BlendOption } from "./model.ts";

/** Cost of the shipments that the named options need, minor units. */
export function shipmentCost(model: BlendModel, options: Iterable<number>): number {
  const { shipments = [] } = model;
  if (shipments.length === 0) return 0;
  const senders = new Set<number>();
  for (const at of options) for (const supplier of model.options[at]!.suppliers ?? []) senders.add(supplier);
  let sum = 0;
  for (const supplier of senders) sum += shipments[supplier]!;
  return sum;
}

/** All shipments together: no blend pays more for them. */
export const allShipments = ({ shipments = [] }: BlendModel): number => shipments.reduce((sum, cost) => sum + cost, 0);

/** What each string type of a supplier is charged in the shared model. */
export function shipmentShares(model: BlendModel): readonly number[] {
  const { shipments = [], options, maxTypes } = model;
  const parts = shipments.map(() => new Set<number>());
  for (const { suppliers = [], partIndex, maxStrings } of options)
    if (maxStrings > 0) for (const supplier of suppliers) parts[supplier]!.add(partIndex);
  return shipments.map((cost, at) => Math.floor(cost / Math.max(1, Math.min(maxTypes, parts[at]!.size))));
}

/** Share that one option bears. */
export const shareOf = ({ suppliers = [] }: BlendOption, shares: readonly number[]): number =>
  suppliers.reduce((sum, supplier) => sum + shares[supplier]!, 0);

/** Options by the model that they were charged from, for one search asks many times. */
const known = new WeakMap<BlendModel, BlendModel>();

/** The model whose tables bear the shares; the same model where nobody charges for a shipment. */
export function withShares(model: BlendModel): BlendModel {
  const { shipments = [] } = model;
  if (!shipments.some((cost) => cost > 0)) return model;
  const done = known.get(model);
  if (done !== undefined) return done;
  const shares = shipmentShares(model);
  const charged = { ...model, options: model.options.map((option) => charge(option, shareOf(option, shares))) };
  known.set(model, charged);
  known.set(charged, charged);
  return charged;
}

function charge(option: BlendOption, share: number): BlendOption {
  if (share === 0) return option;
  const { floor } = option;
  let table: Float64Array | undefined;
  return {
    ...facts(option),
    ...(floor === undefined
      ? {}
      : { floor: { ...floor, fixed: floor.fixed + share, least: (floor.least ?? 0) + share } }),
    get costs() {
      table ??= option.costs.map((cost, strings) => (strings === 0 ? 0 : cost + share));
      return table;
    },
  };
}

/** All but the table, which a copy of the whole would build at once. */
export function facts(option: BlendOption): Omit<BlendOption, "costs" | "floor"> {
  const { capacity, volume, mass, units, maxStrings, partIndex, suppliers } = option;
  const plain = { capacity, volume, mass, units, maxStrings, partIndex };
  return suppliers === undefined ? plain : { ...plain, suppliers };
}
