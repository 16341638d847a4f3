// Answers a state's question to the engine: reads the brief, plans, assesses what is pinned and chosen, and counts the order.

import type { Brief, LayoutResult, PlanResult } from "../search/index.ts";
import type { FrontPoint } from "./axes.ts";
import { briefInput } from "./briefInput.ts";
import type { EnginePort, PlanRequest } from "./ports.ts";
import type { Answer, State } from "./state.ts";

/** Most layouts of a list. */
export const MOST_LISTED = 200;

/** Beside the form only the first few are seen, and every key waits for them; the list itself is longer. */
export const mostListed = (state: Pick<State, "screen">): number => (state.screen === "brief" ? 50 : MOST_LISTED);

/** What of a state the engine is asked: plain data, fit to be sent to a thread. */
export type Question = Pick<State, "values" | "extra" | "rank" | "frontOnly" | "chosen" | "pins" | "screen" | "map">;

export const questionOf = ({ values, extra, rank, frontOnly, chosen, pins, screen, map }: State): Question => ({
  values,
  extra,
  rank,
  frontOnly,
  chosen,
  pins,
  screen,
  map,
});

/** The whole front, on the map alone; with lives when an axis shows them. */
function frontFor({ screen, map }: Question, engine: EnginePort, brief: Brief, plan: PlanResult) {
  if (screen !== "map") return null;
  const lives = map.x === "life" || map.y === "life";
  return engine
    .front(brief, plan)
    .map((layout): FrontPoint => ({ layout, life: lives ? engine.life(brief, layout) : null }));
}

export function answerFor(
  state: Question,
  engine: EnginePort,
  quick: boolean,
  progress?: PlanRequest["progress"],
): Answer {
  const read = engine.readBrief(briefInput(state));
  if (!read.ok) return { kind: "refused", refusals: read.refusals };
  const brief = read.value;
  const planned = engine.plan(brief, {
    rank: state.rank,
    most: mostListed(state),
    frontOnly: state.frontOnly,
    quick,
    progress,
  });
  if (!planned.ok) return { kind: "refused", refusals: planned.refusals };
  const plan = planned.value;
  const assessed = (arrangement: State["chosen"]): LayoutResult | null =>
    arrangement === null ? null : engine.check(brief, arrangement);
  const chosen = assessed(state.chosen);
  return {
    kind: "planned",
    brief,
    changesSought: !quick || plan.layouts.length > 0,
    plan,
    pinned: state.pins.map(assessed),
    chosen,
    front: frontFor(state, engine, brief, plan),
    bill: chosen === null ? null : engine.bill(brief, chosen),
  };
}
