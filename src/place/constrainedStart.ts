// A first placing that honours pins, lots, polarity and size; the searches then only exchange units of one class.
import { type Constraints, lotRange } from "./constraints.ts";
import { stageGap } from "./gap.ts";

export type Start = { readonly ok: true; readonly groups: number[][] } | { readonly ok: false; readonly why: string };

const MOST_DIVISIONS = 500;

/** Ways to give `groups` groups to labels of which each can fill `room[i]` and must fill `least[i]`. */
function* divisions(room: readonly number[], least: readonly number[], groups: number): Generator<number[]> {
  if (room.length === 0) {
    if (groups === 0) yield [];
    return;
  }
  for (let q = Math.min(room[0]!, groups); q >= least[0]!; q--) {
    for (const rest of divisions(room.slice(1), least.slice(1), groups - q)) yield [q, ...rest];
  }
}

const nameOf = (label: string): string => label.split("\u0000").filter(Boolean).join(" / ") || "unmarked";

/** Label of each group: pins and rooms decide first, the rest is divided so that group sums differ least. */
function labelGroups(rule: Constraints, order: readonly number[], values: Float64Array): string[] | string {
  const labels = [...new Set(rule.label)];
  const fixed: (string | undefined)[] = new Array(rule.groups).fill(undefined);
  for (const [i, group] of rule.pinnedTo.entries()) {
    if (group < 0) continue;
    if (fixed[group] !== undefined && fixed[group] !== rule.label[i]) {
      return `the units pinned to group ${group + 1} may not share it`;
    }
    if (rule.takes[group] !== undefined && rule.takes[group] !== rule.kind[i]) {
      return `group ${group + 1} takes ${rule.takes[group]}, not ${rule.kind[i] || "unmarked units"}`;
    }
    fixed[group] = rule.label[i]!;
  }
  const mayTake = (group: number, label: string): boolean =>
    (fixed[group] === undefined || fixed[group] === label) &&
    (rule.takes[group] === undefined || label.startsWith(`${rule.takes[group]}\u0000`));
  const members = labels.map((label) => order.filter((i) => rule.label[i] === label));
  const room = members.map((list) => Math.floor(list.length / rule.size));
  const least = labels.map((label) => fixed.filter((f) => f === label).length);
  let best: { gap: number; names: string[] } | null = null;
  let tried = 0;
  for (const division of divisions(room, least, rule.groups)) {
    if (++tried > MOST_DIVISIONS) break;
    const names = assignNames(labels, division, rule.groups, mayTake);
    if (names === null) continue;
    const sums = labels.flatMap((_, l) => {
      const used = members[l]!.slice(0, division[l]! * rule.size);
      const mean = used.reduce((sum, i) => sum + values[i]!, 0) / Math.max(1, division[l]!);
      return new Array<number>(division[l]!).fill(mean);
    });
    const gap = stageGap(sums, sums.length);
    if (best === null || gap < best.gap) best = { gap, names };
  }
  if (best !== null) return best.names;
  return `no way to fill ${rule.groups} groups of ${rule.size} from ${labels.map((label, l) => `${members[l]!.length} ${nameOf(label)}`).join(", ")}`;
}

/** Gives each group a label, the choosiest groups first, or null. */
function assignNames(
  labels: readonly string[],
  division: readonly number[],
  groups: number,
  mayTake: (group: number, label: string) => boolean,
): string[] | null {
  const left = [...division];
  const names: string[] = new Array(groups).fill("");
  const choices = (group: number): number => labels.filter((label) => mayTake(group, label)).length;
  const order = Array.from({ length: groups }, (_, g) => g).sort((a, b) => choices(a) - choices(b) || a - b);
  for (const group of order) {
    const pick = labels.findIndex((label, l) => left[l]! > 0 && mayTake(group, label));
    if (pick < 0) return null;
    names[group] = labels[pick]!;
    left[pick] = left[pick]! - 1;
  }
  return names;
}

/** How many units of each lot every group of one label takes; `pinned[g]` are its counts so far. Null when pins break the mix. */
function lotDemand(
  rule: Constraints,
  members: readonly number[],
  pinned: readonly ReadonlyMap<string, number>[],
): Map<string, number>[] | null {
  const lots = [...new Set(members.map((i) => rule.lot[i]!))];
  const have = new Map(lots.map((lot) => [lot, members.filter((i) => rule.lot[i] === lot).length]));
  const range = new Map(lots.map((lot) => [lot, lotRange(rule.size, have.get(lot)!, members.length)]));
  const demand = pinned.map(
    (counts) => new Map(lots.map((lot) => [lot, Math.max(range.get(lot)![0], counts.get(lot) ?? 0)])),
  );
  const spoken = (lot: string): number => demand.reduce((sum, counts) => sum + counts.get(lot)!, 0);
  for (const counts of demand) {
    if (lots.some((lot) => counts.get(lot)! > range.get(lot)![1])) return null;
    let open = rule.size - [...counts.values()].reduce((sum, c) => sum + c, 0);
    if (open < 0) return null;
    while (open-- > 0) {
      const free = lots.filter((lot) => counts.get(lot)! < range.get(lot)![1] && spoken(lot) < have.get(lot)!);
      if (free.length === 0) return null;
      const pick = free.reduce((a, b) => (have.get(b)! - spoken(b) > have.get(a)! - spoken(a) ? b : a));
      counts.set(pick, counts.get(pick)! + 1);
    }
  }
  return demand;
}

/**
 * Fills the groups from `order` (units to keep first). Within a class the larger units go first, each into the group that is lowest.
 */
export function constrainedStart(rule: Constraints, order: readonly number[], values: Float64Array): Start {
  const names = labelGroups(rule, order, values);
  if (typeof names === "string") return { ok: false, why: names };
  const groups: number[][] = Array.from({ length: rule.groups }, () => []);
  for (const [i, group] of rule.pinnedTo.entries()) if (group >= 0) groups[group]!.push(i);
  const sum = (g: number): number => groups[g]!.reduce((s, i) => s + values[i]!, 0);
  for (const label of new Set(names)) {
    const mine = names.flatMap((name, g) => (name === label ? [g] : []));
    const members = order.filter((i) => rule.label[i] === label);
    const countLots = (g: number): Map<string, number> => {
      const counts = new Map<string, number>();
      for (const i of groups[g]!) counts.set(rule.lot[i]!, (counts.get(rule.lot[i]!) ?? 0) + 1);
      return counts;
    };
    const demand = lotDemand(rule, members, mine.map(countLots));
    if (demand === null) return { ok: false, why: "these pins do not leave the lots evenly mixed" };
    for (const lot of new Set(members.map((i) => rule.lot[i]!))) {
      const open = new Map(mine.map((g, k) => [g, demand[k]!.get(lot)! - (countLots(g).get(lot) ?? 0)]));
      const need = [...open.values()].reduce((s, c) => s + c, 0);
      const pick = members.filter((i) => rule.lot[i] === lot && rule.pinnedTo[i]! < 0).slice(0, need);
      if (pick.length < need) return { ok: false, why: `too few units of ${lot || nameOf(label)} for these pins` };
      for (const i of pick.sort((a, b) => values[b]! - values[a]! || a - b)) {
        const into = mine.filter((g) => open.get(g)! > 0).reduce((a, b) => (sum(b) < sum(a) ? b : a));
        groups[into]!.push(i);
        open.set(into, open.get(into)! - 1);
      }
    }
  }
  return { ok: true, groups };
}
