// The demo: the brief and the invented catalogues that come with the program, planned as text.

import { planCommand } from "./commands/plan.ts";
import { DEMO_CATALOGS, demoFile } from "./demoFiles.ts";
import type { Ports } from "./ports.ts";

/** The bare command where there is no terminal: the plan of the demo brief. */
export function demoCommand(ports: Ports): number {
  const at = (name: string): string => demoFile(ports, name);
  ports.out(
    "The demo: a brief and catalogues that come with joulewright. Every part in them is invented.\nYour own: joulewright plan BRIEF --catalog FILE...   (joulewright --help)\n\n",
  );
  const flags = { catalog: DEMO_CATALOGS.map(at), resistors: at("resistors.csv"), limit: "10" };
  return planCommand(at("demo-brief.json"), flags, ports);
}
