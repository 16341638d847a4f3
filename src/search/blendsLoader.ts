// Brings in the blend search, with the engines behind it, only when blends are asked for.

import type { Read } from "../quantity/index.ts";
import type { Program } from "./blend/program.ts";
import type { BlendPlan } from "./blendResult.ts";
import type { BlendInput } from "./blends.ts";
import type { WholeAnswer } from "./solve.ts";

/** The cheapest mix of whole strings of different parts, with its proof. See `BlendInput` and `BlendPlan`. */
export async function planBlends(input: BlendInput): Promise<Read<BlendPlan>> {
  const { planBlends: planned } = await import("./blends.ts");
  return planned(input);
}

/** One whole-number programme by javascript-lp-solver, in this thread: for a worker that is made for it and may be ended. */
export async function solveWholeHere(program: Program): Promise<WholeAnswer> {
  const { solveWhole } = await import("./solve.ts");
  return solveWhole(program);
}
