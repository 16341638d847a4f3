// The demo's files: which catalogues come with the program, and the brief to start with.

import { join } from "node:path";
import type { Read } from "../quantity/index.ts";
import { type JsonText, readJson } from "./jsonText.ts";
import type { Ports } from "./ports.ts";

export const DEMO_CATALOGS: readonly string[] = [
  "electrolytic.csv",
  "film.csv",
  "oil-and-paper.csv",
  "double-layer.csv",
  "home-made.csv",
  "drawer.csv",
];

export const DEMO_RESISTORS = "resistors.csv";

export const demoFile = ({ catalogs }: Pick<Ports, "catalogs">, name: string): string => join(catalogs, name);

/** The demo's brief; refused when the package is not whole. */
export function demoBrief(ports: Pick<Ports, "catalogs" | "files">): Read<JsonText> {
  const path = demoFile(ports, "demo-brief.json");
  const text = ports.files.read(path);
  return text.ok ? readJson(text.value, path) : text;
}
