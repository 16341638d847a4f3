// What the screens and their thread say to each other, and the thread's side of it: one question at a time, answered with progress on the way.
import type { Capacitor, ResistorFamily } from "../catalog/index.ts";
import type { Brief } from "../search/index.ts";
import type { BlendAnswer, Stage } from "./blend/state.ts";
import { briefInput } from "./briefInput.ts";
import { catalogEngine, type Stock } from "./catalogEngine.ts";
import { answerFor, MOST_LISTED, type Question } from "./engine.ts";
import type { Details, EnginePort, Piece } from "./ports.ts";
import type { Answer } from "./state.ts";

export type ThreadAsk =
  | { readonly kind: "stock"; readonly parts: readonly Capacitor[]; readonly families: readonly ResistorFamily[] }
  | { readonly kind: "plan"; readonly id: number; readonly question: Question }
  | { readonly kind: "piece"; readonly id: number; readonly question: Question; readonly piece: Piece }
  | {
      readonly kind: "blend";
      readonly id: number;
      readonly brief: Brief;
      /** Looked at on the way: not 0 is stop. */
      readonly stop: Int32Array<SharedArrayBuffer>;
    };

export type ThreadReply =
  | { readonly kind: "progress"; readonly id: number; readonly done: number; readonly total: number }
  | { readonly kind: "planned"; readonly id: number; readonly answer: Answer }
  | { readonly kind: "stage"; readonly id: number; readonly stage: Stage }
  | { readonly kind: "blended"; readonly id: number; readonly answer: BlendAnswer }
  | { readonly kind: "worked"; readonly id: number; readonly value: Details[Piece] };

function pieceFor(engine: EnginePort, question: Question, piece: Piece): Details[Piece] {
  const brief = engine.readBrief(briefInput(question));
  const bank = brief.ok && question.chosen !== null ? engine.check(brief.value, question.chosen) : null;
  return brief.ok && bank !== null ? engine[piece](brief.value, bank) : null;
}

/** Keeps the last plan: another bank or pin under the same brief needs no new search. The list is always the long one. */
function remembering(engine: EnginePort): EnginePort {
  let last: { readonly key: string; readonly planned: ReturnType<EnginePort["plan"]> } | null = null;
  return {
    ...engine,
    plan: (brief, request) => {
      const whole = { ...request, most: MOST_LISTED };
      const { rank, frontOnly, quick } = whole;
      const key = JSON.stringify([brief, rank, frontOnly, quick]);
      if (last?.key !== key) last = { key, planned: engine.plan(brief, whole) };
      return last.planned;
    },
  };
}

/** Takes the asks of one thread. `now`: milliseconds from any beginning. */
export function threadServer(reply: (reply: ThreadReply) => void, now: () => number): (ask: ThreadAsk) => void {
  let stock: Stock = { parts: [], families: [] };
  let engine: EnginePort = catalogEngine(stock);
  return (ask) => {
    if (ask.kind === "stock") {
      stock = ask;
      engine = remembering(catalogEngine(ask));
      return;
    }
    if (ask.kind === "blend") {
      const { id, brief, stop } = ask;
      const told = (stage: Stage): void => reply({ kind: "stage", id, stage });
      // What goes wrong here ends the thread, as in any other work of its own.
      void import("./blend/work.ts")
        .then(({ blendAnswer }) => blendAnswer({ ...stock, brief, told, stop: () => Atomics.load(stop, 0) !== 0, now }))
        .then((answer) => reply({ kind: "blended", id, answer }));
      return;
    }
    const { id, question } = ask;
    if (ask.kind === "piece") {
      reply({ kind: "worked", id, value: pieceFor(engine, question, ask.piece) });
      return;
    }
    let told = now();
    const progress = (done: number, total: number): void => {
      if (now() - told < TELL_MS && done < total) return;
      told = now();
      reply({ kind: "progress", id, done, total });
    };
    reply({ kind: "planned", id, answer: answerFor(question, engine, true, progress) });
  };
}

/** Progress is told this often: oftener is not seen. */
const TELL_MS = 100;
