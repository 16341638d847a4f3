// The thread's side of the screen of blends: the cheapest layout of one part, the blends beside it, the cautions of what was found.
import type { Capacitor, ResistorFamily } from "../../catalog/index.ts";
import { cautionsOf } from "../../cli/index.ts";
import { type Brief, type LayoutResult, plan, planBlends } from "../../search/index.ts";
import type { BlendAnswer, Stage } from "./state.ts";

export interface BlendAsk {
  readonly brief: Brief;
  readonly parts: readonly Capacitor[];
  readonly families: readonly ResistorFamily[];
  readonly told: (stage: Stage) => void;
  readonly stop: () => boolean;
  /** Milliseconds from any beginning. */
  readonly now: () => number;
}

/** Others are listed up to so much dearer, and the ladder goes from so much less energy to so much more: with more it would mostly end below what is asked. */
export const WITHIN = 0.1;
export const LADDER = 0.1;

/** The cheapest with a price, as the command compares. */
function cheapestOf({ brief, parts, families }: BlendAsk): LayoutResult | null {
  const planned = plan({ brief, parts, families, limit: 20, rank: "cost", quick: true });
  const priced = planned.ok ? planned.value.layouts.filter(({ cost }) => cost !== null) : [];
  return priced.sort((a, b) => (a.cost?.total ?? 0) - (b.cost?.total ?? 0))[0] ?? null;
}

export async function blendAnswer(ask: BlendAsk): Promise<BlendAnswer> {
  const { brief, parts, families, told, stop, now } = ask;
  told("one part");
  const single = cheapestOf(ask);
  const read = await planBlends({ brief, parts, families, within: WITHIN, ladder: LADDER, clock: now, stop, told });
  const best = read.ok ? read.value.blends[0] : undefined;
  const lines = (best?.strings ?? []).flatMap((group) => {
    const unit = parts.find(({ part }) => part === group.part);
    // The whole bank's charge decides how much of a blast an arc would be.
    return unit === undefined || best === undefined
      ? []
      : cautionsOf(brief, { layout: { ...group, capacitance: best.capacitance }, unit });
  });
  const all = lines.length > 0 ? lines : cautionsOf(brief);
  const cautions = all.filter(({ id }, at) => all.findIndex((one) => one.id === id) === at).map(({ text }) => text);
  return { plan: read, single, cautions };
}
