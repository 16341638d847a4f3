// Random keys at random sizes against the screens without their process: what must hold after every key is checked.

import type { BlendEffect, BlendMessage } from "../../src/tui/blend/state.ts";
import { rowCells } from "../../src/tui/cells.ts";
import { detailKey, detailsOf, wantedPiece, withPiece } from "../../src/tui/detail.ts";
import { answerFor } from "../../src/tui/engine.ts";
import { FIELDS } from "../../src/tui/fields.ts";
import { messageFor } from "../../src/tui/keys.ts";
import { PaintStream } from "../../src/tui/paint.ts";
import type { EnginePort } from "../../src/tui/ports.ts";
import { readSaved, savedText } from "../../src/tui/saved.ts";
import type { Answer, Message, State } from "../../src/tui/state.ts";
import { createStore } from "../../src/tui/store.ts";
import { makeTokeniser } from "../../src/tui/tokens.ts";
import { update } from "../../src/tui/update/update.ts";
import { drawScreen } from "../../src/tui/view/screen.ts";
import { SHARED_WORDS } from "../../src/tui/workshop.ts";
import { foundFor, plannedOn } from "./blendScreen.ts";
import { Screen } from "./screen.ts";
import { CATALOGUE_FACTS, engine, STOCK, stateWith } from "./stock.ts";

/** Small numbers from a seed (mulberry32). */
export function randomFrom(seed: number): () => number {
  let a = seed >>> 0;
  return () => {
    a = (a + 0x6d2b79f5) >>> 0;
    let t = Math.imul(a ^ (a >>> 15), a | 1);
    t = (t + Math.imul(t ^ (t >>> 7), t | 61)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

const KEYS = [
  ..."0123456789.kJVm%q?xrfapeengjGkycl   -µΩ漢😀",
  "\r",
  "\t",
  "\x7f",
  "\x08",
  "\x01",
  "\x05",
  "\x0b",
  "\x15",
  "\x17",
  "\x0c",
  "\x1b",
  "\x1b[A",
  "\x1b[B",
  "\x1b[C",
  "\x1b[D",
  "\x1b[H",
  "\x1b[F",
  "\x1b[3~",
  "\x1b[5~",
  "\x1b[6~",
  "\x1b[Z",
  "\x1b1",
  "\x1b2",
  "\x1b3",
  "\x1b4",
  "\x1b5",
  "\x1b6",
  "\x1b7",
  "\x1b7",
  "\x1b8",
  "\x1b9",
  "\x1bt",
  "\x1bu",
  "\x1bU",
  ..."+<>[]uUtdvxyoh89",
  "\x1b[1;3A",
  "\x1b[1;3B",
  "\x1b[5;3~",
  "\x1b[6;3~",
  "\x12",
  "\x1b[24~",
  "\x1b[<0;10;7M",
  "\x1b[<0;30;1M",
  "\x1b[<65;3;9M",
  "\x1b]11;rgb:ffff/ffff/ffff\x07",
  "\x1bOP",
  "\x1b[12~",
  "\x1b[13~",
  "\x1b[200~2 kV\nq\x1b[201~",
  "\x1b[I",
  "\x1b[<0;3;4M",
];
const SIZES = [
  [60, 16],
  [60, 20],
  [80, 24],
  [100, 30],
  [150, 40],
  [200, 50],
  [59, 15],
  [20, 5],
  [1, 1],
] as const;

/** Types a brief that can be planned into an emptied form: random letters alone would soon leave nothing but refusals. */
const MEND = `\x1b1\x1b[5~\x152.4 kJ\t\x152.2 kV\t\x15100 %${"\t\x15".repeat(FIELDS.length - 3)}`;

/** Pins two layouts and goes to compare them. */
const PIN = "\x1b2 \x1b[B \x1b3";

/** Goes to the blends and has one found, or stopped. */
const BLEND = "\x1bb\r";
const STOP_BLEND = "\x1bb\x1b";

/** Gives a load and goes to see the shot, or asks for the spread. */
const LOAD = "\x1b6l\x1550 mohm\t\x1520 uH\x1b6";
const SPREAD = "\x1b5c";

export interface MonkeyReport {
  readonly keys: number;
  /** What did not hold, with the keys that led there; empty when all did. */
  readonly faults: readonly string[];
  readonly screens: ReadonlySet<string>;
}

/** Most of a plan's time is its list in full: a few screens of it scroll as well as many. */
const short: EnginePort = {
  ...engine,
  plan: (brief, request) => engine.plan(brief, { ...request, most: Math.min(60, request.most) }),
};

/** Types `count` keys. Every `look`th frame is compared cell by cell with a full repaint. */
export async function runMonkey(seed: number, count: number, look: number): Promise<MonkeyReport> {
  const random = randomFrom(seed);
  const pick = <T>(list: readonly T[]): T => list[Math.floor(random() * list.length)] as T;
  const faults: string[] = [];
  const seen = new Set<string>();
  const trail: string[] = [];
  const screen = new Screen(80, 24);
  const paint = new PaintStream({ columns: 80, rows: 24 }, (text) => screen.feed(text));
  screen.feed("\x1b[?7l");
  const files = new Set<string>();
  /** The same question is worked out once: monkeys come back to the same brief often. */
  const answers = new Map<string, Answer>();
  let wanted = false;
  const store = createStore({
    initial: stateWith(),
    update,
    run: (effect, send) => {
      if (effect.type === "ask") wanted = true;
      if (effect.type === "overrides") {
        // Saved, and read again as it was saved.
        const { overrides } = effect;
        send({ type: "opened", stock: STOCK, words: SHARED_WORDS, catalogue: CATALOGUE_FACTS, overrides });
      }
      if (effect.type === "blend") blend(effect.effect);
      if (effect.type !== "export") return;
      const there = files.has(effect.path) && !effect.replace;
      files.add(effect.path);
      send({
        type: "saved",
        answer: there ? { kind: "exists", path: effect.path } : { kind: "saved", path: effect.path },
      });
    },
    changed: () => {},
  });
  const send = (message: Message): void => store.send(message);
  /** One answer does for every brief: what is drawn of it is looked at, not what it says. */
  const { answer: blended } = await foundFor(plannedOn());
  const blend = (effect: BlendEffect): void => {
    const tell = (message: BlendMessage): void => send({ type: "blend", message });
    if (effect.what === "find") tell({ type: "begun", key: effect.key });
    else tell({ type: "found", answer: blended, seconds: 1 });
  };
  const answer = (): void => {
    if (!wanted) return;
    wanted = false;
    const state = store.state();
    const { asked, values, pins, chosen, rank, frontOnly, screen: name } = state;
    const question = JSON.stringify([
      values,
      pins,
      chosen,
      rank,
      frontOnly,
      name === "brief",
      name === "map" && state.map,
    ]);
    const found = answers.get(question) ?? answerFor(state, short, true);
    answers.set(question, found);
    send({ type: "answered", asked, answer: found, slow: false });
  };
  const fault = (what: string, state: State): void => {
    faults.push(
      `${what} on ${state.screen} at ${state.columns} by ${state.rows} after ${JSON.stringify(trail.slice(-12))}`,
    );
  };
  /** The next missing piece, as after a frame; the same piece of the same bank is worked out once. */
  const pieces = new Map<string, unknown>();
  const detail = (): void => {
    const state = store.state();
    const piece = wantedPiece(state);
    const key = detailKey(state);
    if (piece === null || key === null) return;
    const name = `${piece}\n${key}`;
    const known = pieces.get(name);
    const details =
      known === undefined ? withPiece(state, piece, engine) : { ...detailsOf(state), key, [piece]: known };
    if (details === null) return;
    pieces.set(name, details[piece]);
    send({ type: "detailed", details });
  };
  const tokens = makeTokeniser();
  answer();
  for (let key = 0; key < count && faults.length < 5; key += 1) {
    const typed =
      random() < 0.02
        ? MEND
        : random() < 0.01
          ? PIN
          : random() < 0.02
            ? pick([LOAD, SPREAD, BLEND, STOP_BLEND])
            : pick(KEYS);
    trail.push(typed);
    if (random() < 0.01) {
      const [columns, rows] = pick(SIZES);
      screen.term.resize(columns, rows);
      paint.resize({ columns, rows });
      send({ type: "resized", columns, rows });
    }
    for (const event of [...tokens.push(typed), ...tokens.flush()]) {
      const message = messageFor(store.state(), event);
      if (message !== null && message.type !== "quit") send(message);
    }
    if (random() < 0.7) answer();
    if (random() < 0.7) detail();
    const state = store.state();
    const { columns, rows } = state;
    const listed = state.answer?.kind === "planned" && state.answer.plan.layouts.length > 0;
    seen.add(state.screen + (state.help ? "+help" : "") + (state.prompt ? "+prompt" : ""));
    seen.add(`${state.screen} ${listed ? "listed" : "empty"} ${state.pins.length}`);
    if (state.screen === "blend" && state.blend.found !== null) seen.add("blend found");
    seen.add(`${state.screen} with ${Object.keys(detailsOf(state) ?? {}).join(" ")}`);
    const drawn = drawScreen(state);
    if (drawn.rows.length > rows || drawn.rows.some((row) => rowCells(row, 9999).length > columns))
      fault("outside the screen", state);
    if (drawn.caret && (drawn.caret.row >= rows || drawn.caret.column >= columns)) fault("caret outside", state);
    const back = readSaved(savedText(state));
    if (back === null || JSON.stringify(back.pins) !== JSON.stringify(state.pins)) fault("not saved whole", state);
    paint.caret = drawn.caret;
    paint.paint(drawn.rows);
    if (key % look === 0) {
      await screen.settle();
      const fresh = new Screen(columns, rows);
      const full = new PaintStream({ columns, rows }, (text) => fresh.feed(text));
      fresh.feed("\x1b[?7l");
      full.paint(drawn.rows);
      await fresh.settle();
      if (JSON.stringify(fresh.dump()) !== JSON.stringify(screen.dump())) fault("stale cells", state);
      fresh.term.dispose();
    }
  }
  screen.term.dispose();
  return { keys: count, faults, screens: seen };
}
