// `plan --blend`: the ranked layouts, and the cheapest mix of strings with its proof.

import { nearestWord, type Refusal } from "../../quantity/index.ts";
import { planBlends } from "../../search/index.ts";
import { type BlendFlags, readBlendFlags } from "../blendFlags.ts";
import { blendText } from "../blendText.ts";
import { explainText } from "../blendWords.ts";
import { engineApart } from "../engineThread.ts";
import { EXIT } from "../exit.ts";
import type { Ports } from "../ports.ts";
import { tell } from "../tell.ts";
import { toJson } from "../toJson.ts";
import { type PlanFlags, planFrom, planJson, planWords, tellFaults } from "./plan.ts";

/** Engines that may be put in the place of the real ones, as a test does. */
export type Engines = Pick<Parameters<typeof planBlends>[0], "settle" | "clock">;

export async function planBlendCommand(
  brief: string | undefined,
  flags: PlanFlags & BlendFlags,
  ports: Ports,
  engines: Engines = {},
): Promise<number> {
  const wish = readBlendFlags(flags);
  const planned = planFrom(brief, flags, ports);
  if (!wish.ok || !planned.ok) {
    const faults = [...(wish.ok ? [] : wish.refusals), ...(planned.ok ? [] : planned.refusals)];
    return tell(ports, faults, flags.json);
  }
  const { settings, stock, result } = planned.value;
  const { parts, families } = stock;
  const strange = unknownSuppliers(wish.value?.shipments?.named ?? {}, [...parts, ...families]);
  if (strange.length > 0) return tell(ports, strange, flags.json);
  const clock = (): number => performance.now();
  const entry = ports.background?.entry ?? null;
  const apart = entry === null ? {} : { apart: engineApart(entry) };
  const blends = await planBlends({
    brief: settings.brief,
    parts,
    families,
    ...wish.value,
    clock,
    ...apart,
    ...engines,
  });
  if (!blends.ok) return tell(ports, blends.refusals, flags.json);
  tellFaults(stock, ports);
  const { blends: found, ...search } = blends.value;
  if (flags.json) ports.out(toJson({ ...planJson(planned.value), blends: found, blendSearch: search }));
  else {
    // The layout to compare with is the cheapest, whatever the ranking asked for.
    const single = [...result.layouts].sort((a, b) => (a.cost?.total ?? Infinity) - (b.cost?.total ?? Infinity))[0];
    const text = blendText({ plan: blends.value, single, width: ports.columns });
    const why = flags.explain ? `\n${explainText(blends.value, ports.columns)}` : "";
    ports.out(`${planWords(planned.value, ports.columns)}\n${text}${why}`);
  }
  return found.length > 0 || result.layouts.length > 0 ? EXIT.done : EXIT.unsafe;
}

/** A shipment of a supplier whom no catalogue names would count for nothing, so it is a slip. */
function unknownSuppliers(
  named: Readonly<Record<string, number>>,
  things: readonly { readonly supplier?: string }[],
): readonly Refusal[] {
  const known = [...new Set(things.flatMap(({ supplier }) => (supplier === undefined ? [] : [supplier])))];
  return Object.keys(named)
    .filter((name) => !known.includes(name))
    .map((name) => {
      const near = nearestWord(name, known);
      const want = near !== null ? `perhaps ${JSON.stringify(near)}` : "a supplier that the catalogues name";
      return { code: "unknown-supplier", place: { field: "--shipment-cost" }, read: JSON.stringify(name), want };
    });
}
