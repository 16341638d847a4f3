// A completion script for fish.

import type { CommandFacts, CommandTree, OptionFacts } from "./commandTree.ts";

const quoted = (text: string): string => `'${text.replace(/[\\']/g, "\\$&")}'`;
/** Words of a list that fish splits at blanks. */
const listed = (words: readonly string[]): string => quoted(words.map((word) => word.replaceAll(" ", "\\ ")).join(" "));

const START = "complete -c joulewright";

function optionLine(when: string, { long, short, value, file, words, help }: OptionFacts): string {
  const letter = short === null ? "" : ` -s ${short.slice(1)}`;
  const follows = value === null ? "" : words.length > 0 ? ` -x -a ${listed(words)}` : file ? " -r -F" : " -x";
  return `${START} -n ${quoted(when)} -l ${long.slice(2)}${letter}${follows} -d ${quoted(help)}`;
}

function commandLines(command: CommandFacts): readonly string[] {
  const when = `__fish_seen_subcommand_from ${command.name}`;
  const words = command.arguments.flatMap((argument) => argument.words);
  return [
    ...command.options.map((option) => optionLine(when, option)),
    ...(words.length > 0 ? [`${START} -n ${quoted(when)} -a ${listed(words)}`] : []),
    ...(command.arguments.some(({ file }) => file) ? [`${START} -n ${quoted(when)} -F`] : []),
  ];
}

/** The script: `joulewright completion fish | source`. */
export function fishCompletion(tree: CommandTree): string {
  const names = tree.commands.map(({ name }) => name);
  const bare = "__fish_use_subcommand";
  const lines = [
    `# Completion of joulewright ${tree.version} for fish. Made by: joulewright completion fish`,
    `${START} -f`,
    ...tree.commands.map(({ name, summary }) => `${START} -n ${bare} -a ${name} -d ${quoted(summary)}`),
    ...tree.options.map((option) => optionLine(bare, option)),
    ...tree.commands.filter(({ name }) => name !== "help").flatMap(commandLines),
    `${START} -n ${quoted("__fish_seen_subcommand_from help")} -a ${listed(names.filter((name) => name !== "help"))}`,
  ];
  return `${lines.join("\n")}\n`;
}
