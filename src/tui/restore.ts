// Builds the state to start with: what was saved last time, or the brief given, and a word when saved text could not be read.
import type { ScreenPorts } from "./ports.ts";
import { isNewer, readSaved } from "./saved.ts";
import { initialState, type State } from "./state.ts";
import { terminalLook } from "./terminal.ts";

/** Size taken when the terminal does not tell its own. */
const USUAL = { columns: 80, rows: 24 };

export function startState(ports: ScreenPorts): State {
  const { stdin, stdout, env, ascii, ground, stock, brief, briefFirst, extra } = ports;
  const look = terminalLook({
    env,
    inputIsTerminal: stdin.isTTY === true,
    outputIsTerminal: stdout.isTTY === true,
    ...(ascii === undefined ? {} : { ascii }),
    ...(ground === undefined ? {} : { ground }),
  });
  const fresh = initialState({
    columns: stdout.columns || USUAL.columns,
    rows: stdout.rows || USUAL.rows,
    look,
    stock,
    values: brief,
    extra,
  });
  const text = ports.loadSession();
  if (text === null) return fresh;
  const saved = readSaved(text);
  if (saved !== null) {
    const restored: State = { ...fresh, ...saved, ...(briefFirst ? { values: brief, extra } : {}) };
    return { ...restored, caret: (restored.values.energy ?? "").length };
  }
  const kept = ports.keepSession();
  const where = kept === null ? "it will be replaced" : `it is kept in ${kept}`;
  const why = isNewer(text) ? "is of a newer version of this program" : "could not be read";
  return { ...fresh, notice: { tone: "warn", text: `What was saved last time ${why}; ${where}.` } };
}
