// `completion`: a script that completes the commands, their options and their words in a shell.

import { nearestWord } from "../../quantity/index.ts";
import type { CommandTree } from "../commandTree.ts";
import { bashCompletion } from "../completeBash.ts";
import { fishCompletion } from "../completeFish.ts";
import { zshCompletion } from "../completeZsh.ts";
import { EXIT } from "../exit.ts";
import { SHELLS, type Shell } from "../flagWords.ts";
import type { Ports } from "../ports.ts";
import { tell } from "../tell.ts";

const SCRIPTS: Readonly<Record<Shell, (tree: CommandTree) => string>> = {
  bash: bashCompletion,
  zsh: zshCompletion,
  fish: fishCompletion,
};

export function completionCommand(shell: string, tree: CommandTree, ports: Ports): number {
  const known = SHELLS.find((one) => one === shell.toLowerCase());
  if (known === undefined) {
    const near = nearestWord(shell, SHELLS);
    const want = `${near === null ? "" : `perhaps ${JSON.stringify(near)}; `}one of ${SHELLS.join(", ")}`;
    return tell(ports, [{ code: "bad-choice", place: { field: "shell" }, read: JSON.stringify(shell), want }]);
  }
  ports.out(SCRIPTS[known](tree));
  return EXIT.done;
}
