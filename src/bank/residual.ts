// Reverse voltage after a dump: the worst of the states that a hold can leave, the corner that causes it, and whether it may be.
import { type Corner, dumpedCorners } from "./corners.ts";
import type { StageRange } from "./cornersRange.ts";

export interface Residual {
  /** Greatest reverse voltage on a stage, V, never below 0, and the corner behind it. */
  readonly reverse: number;
  readonly reverseCorner: Corner;
  /** Greatest forward voltage that stays on a stage, V: the ends read zero meanwhile. */
  readonly forward: number;
  readonly forwardCorner: Corner;
  /** What a unit stands in reverse, V; null when unknown. */
  readonly allowed: number | null;
  readonly verdict: "pass" | "fail" | "not assessed";
  readonly clampNeeded: boolean;
}

/** Reverse below this share of the bank's voltage is rounding. */
const NOTHING = 1e-12;

/**
 * What an instant dump from `voltage` (V) leaves. `hold` says what came before: `none` (a dump straight after the charge leaves
 * nothing), `equalised` or `held` (see dumpedCorners). `allowed` (V) is the unit's reverse rating: null with `polarised` calls for a clamp.
 */
export function residualAfterDump(given: {
  readonly ranges: readonly StageRange[];
  readonly voltage: number;
  readonly hold: "none" | "equalised" | "held";
  readonly allowed: number | null;
  readonly polarised: boolean;
}): Residual {
  const { ranges, voltage, hold, allowed, polarised } = given;
  const { lowest, highest } = dumpedCorners(ranges, voltage, hold === "held" ? "held" : "equalised");
  const reverse = hold === "none" ? 0 : Math.max(0, -lowest.voltage);
  const forward = hold === "none" ? 0 : Math.max(0, highest.voltage);
  const reversed = reverse > NOTHING * voltage;
  const over = allowed !== null && reverse > allowed * (1 + 1e-9);
  return {
    reverse,
    reverseCorner: lowest,
    forward,
    forwardCorner: highest,
    allowed,
    verdict: !reversed ? "pass" : allowed === null ? "not assessed" : over ? "fail" : "pass",
    clampNeeded: reversed && (over || (allowed === null && polarised)),
  };
}
