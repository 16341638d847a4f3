// `manual`: the manual page, for man.

import type { CommandTree } from "../commandTree.ts";
import { EXIT } from "../exit.ts";
import { manualPage } from "../manual.ts";
import type { Ports } from "../ports.ts";

export function manualCommand(tree: CommandTree, ports: Ports): number {
  ports.out(manualPage(tree));
  return EXIT.done;
}
