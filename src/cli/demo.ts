// The demo: the brief and the invented catalogues that come with the program, planned as text.

import { join } from "node:path";
import { accepted, type Read } from "../quantity/index.ts";
import { planCommand } from "./commands/plan.ts";
import { readJson } from "./jsonText.ts";
import type { Ports } from "./ports.ts";
import { readStock, type Stock } from "./stock.ts";

export const DEMO_CATALOGS: readonly string[] = [
  "electrolytic.csv",
  "film.csv",
  "oil-and-paper.csv",
  "double-layer.csv",
  "home-made.csv",
  "drawer.csv",
];

/** The demo's brief and stock for the screens; refused when the package is not whole. */
export function demoStock(ports: Ports): Read<Stock & { readonly brief: unknown }> {
  const at = (name: string): string => join(ports.catalogs, name);
  const text = ports.files.read(at("demo-brief.json"));
  if (!text.ok) return text;
  const brief = readJson(text.value, at("demo-brief.json"));
  if (!brief.ok) return brief;
  const stock = readStock({ catalog: DEMO_CATALOGS.map(at), resistors: at("resistors.csv") }, ports.files);
  return stock.ok ? accepted({ ...stock.value, brief: brief.value.value }) : stock;
}

/** The bare command where there is no terminal: the plan of the demo brief. */
export function demoCommand(ports: Ports): number {
  const at = (name: string): string => join(ports.catalogs, name);
  ports.out(
    "The demo: a brief and catalogues that come with joulewright. Every part in them is invented.\nYour own: joulewright plan BRIEF --catalog FILE...   (joulewright --help)\n\n",
  );
  const flags = { catalog: DEMO_CATALOGS.map(at), resistors: at("resistors.csv"), limit: "10" };
  return planCommand(at("demo-brief.json"), flags, ports);
}
