// The command tree of the program itself, for what is made from it.
import { treeOf } from "../../src/cli/commandTree.ts";
import { build } from "../../src/cli/program.ts";
import { fakePorts } from "./fakePorts.ts";

export const TREE = treeOf(build(fakePorts(), () => {}));

/** Every option of every command, by the command's name; the bare program's is "". */
export const OPTIONS = [{ ...TREE, name: "" }, ...TREE.commands].flatMap((command) =>
  command.options.map((option) => ({ command: command.name, option })),
);
