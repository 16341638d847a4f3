// How the screen of blends changes. Pure; what is to be done outside comes back as effects.
import type { Notice } from "../state.ts";
import type { BlendEffect, BlendMessage, BlendState } from "./state.ts";

export interface BlendChange {
  readonly blend: BlendState;
  readonly effects: readonly BlendEffect[];
  /** Absent: what was said before stays. Null: it is taken back. */
  readonly notice?: Notice | null;
}

/** `wanted`: the brief in force and its key; null while there is none to find a blend for. */
export function updateBlend(
  blend: BlendState,
  message: BlendMessage,
  wanted: Extract<BlendEffect, { readonly what: "find" }> | null,
): BlendChange {
  const { running } = blend;
  const warn = (text: string): Notice => ({ tone: "warn", text });
  switch (message.type) {
    case "find":
      if (wanted === null) return { blend, effects: [], notice: warn("There is no whole brief to find a blend for.") };
      return { blend, effects: [wanted], notice: null };
    case "cancel":
      if (running === null) return { blend, effects: [] };
      return { blend: { ...blend, running: { ...running, stopping: true } }, effects: [{ what: "stop" }] };
    case "begun":
      return {
        blend: {
          running: { key: message.key, stage: "one part", seconds: 0, stopping: false },
          found: null,
          ended: null,
        },
        effects: [],
      };
    case "stage":
    case "tick": {
      const { type: _, ...news } = message;
      return { blend: running === null ? blend : { ...blend, running: { ...running, ...news } }, effects: [] };
    }
    case "found": {
      if (running === null) return { blend, effects: [] };
      const { answer, seconds } = message;
      const { key, stopping } = running;
      return {
        blend: { running: null, found: { key, answer, seconds, stopped: stopping }, ended: null },
        effects: [],
        notice: stopping ? warn("Stopped: this is what was known by then.") : null,
      };
    }
    case "ended":
      return {
        blend: { running: null, found: null, ended: { key: message.key, why: message.why } },
        effects: [],
        notice: message.why === "cancelled" ? warn("Cancelled: nothing was in hand yet.") : null,
      };
  }
}
