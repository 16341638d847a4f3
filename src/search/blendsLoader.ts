// Brings in the blend search, with the engines behind it, only when blends are asked for.

import type { Read } from "../quantity/index.ts";
import type { BlendPlan } from "./blendResult.ts";
import type { BlendInput } from "./blends.ts";

/** The cheapest mix of whole strings of different parts, with its proof. See `BlendInput` and `BlendPlan`. */
export async function planBlends(input: BlendInput): Promise<Read<BlendPlan>> {
  const { planBlends: planned } = await import("./blends.ts");
  return planned(input);
}
