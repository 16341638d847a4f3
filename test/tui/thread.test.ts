// The thread's side: no stock yet, a plan, a piece of a part that is not there.
import { expect, test, vi } from "vitest";
import { DEFAULT_FAMILY } from "../../src/catalog/index.ts";
import { answerFor, questionOf } from "../../src/tui/engine.ts";
import { type ThreadReply, threadServer } from "../../src/tui/thread.ts";
import { engine, parts, stateWith } from "../support/stock.ts";

function rig() {
  const replies: ThreadReply[] = [];
  return {
    replies,
    take: threadServer(
      (reply) => replies.push(reply),
      () => 0,
    ),
  };
}
const question = questionOf(stateWith({ screen: "layouts" }));

test("threadServer: before any stock a plan finds nothing; after it the plan is the engine's, the end always told", () => {
  const { replies, take } = rig();
  take({ kind: "plan", id: 1, question });
  expect(replies.at(-1)).toMatchObject({ kind: "planned", id: 1, answer: { plan: { layouts: [] } } });
  take({ kind: "stock", parts: parts(), families: [DEFAULT_FAMILY] });
  take({ kind: "plan", id: 2, question });
  // The clock stands still: only the last part is told.
  expect(replies.slice(-2)).toEqual([
    { kind: "progress", id: 2, done: 4, total: 4 },
    { kind: "planned", id: 2, answer: answerFor(question, engine, true) },
  ]);
});

test("a piece without a bank, of a part that is gone, or of a brief that cannot be read: null", () => {
  const { replies, take } = rig();
  const chosen = { part: "gone", series: 2, parallel: 1, ties: "strings" } as const;
  take({ kind: "piece", id: 1, question, piece: "rest" });
  take({ kind: "piece", id: 2, question: { ...question, chosen }, piece: "rest" });
  take({ kind: "piece", id: 3, question: { ...question, values: {} }, piece: "shot" });
  expect(replies).toEqual([1, 2, 3].map((id) => ({ kind: "worked", id, value: null })));
});

test("a blend: each stage as it begins, then the answer; told to stop before it begins, it claims nothing", async () => {
  const { replies, take } = rig();
  take({ kind: "stock", parts: parts(), families: [DEFAULT_FAMILY] });
  const answer = answerFor(question, engine, true);
  if (answer.kind !== "planned") throw new Error("not planned");
  const { brief } = answer;
  const flag = () => new Int32Array(new SharedArrayBuffer(4));
  take({ kind: "blend", id: 5, brief, stop: flag() });
  await vi.waitFor(() => expect(replies.at(-1)?.kind).toBe("blended"), { timeout: 10_000 });
  expect(replies.at(0)).toEqual({ kind: "stage", id: 5, stage: "one part" });
  expect(replies.at(-1)).toMatchObject({ id: 5, answer: { plan: { value: { status: "optimal" } } } });
  take({ kind: "blend", id: 6, brief, stop: flag().fill(1) });
  await vi.waitFor(() => expect(replies.at(-1)).toMatchObject({ kind: "blended", id: 6 }), { timeout: 10_000 });
  expect(replies.at(-1)).toMatchObject({ answer: { plan: { value: { status: "stopped" } } } });
});
