// A completion script for zsh, for the function path or to be sourced after compinit.

import type { ArgumentFacts, CommandFacts, CommandTree, OptionFacts } from "./commandTree.ts";

/** In single quotes, as the shell takes it. */
const quoted = (text: string): string => `'${text.replaceAll("'", "'\\''")}'`;
/** What has a meaning to _arguments is taken for itself. */
const plain = (text: string): string => text.replace(/[\\[\]:]/g, "\\$&");

const action = ({ words, file }: { readonly words: readonly string[]; readonly file: boolean }): string =>
  words.length > 0 ? `(${words.map((word) => word.replaceAll(" ", "\\ ")).join(" ")})` : file ? "_files" : " ";

function optionSpec(option: OptionFacts): readonly string[] {
  const { long, short, value, variadic, help } = option;
  const names = short === null ? [long] : [long, short];
  const name = plain((value ?? "").replace(/[<>.]/g, ""));
  const follows = value === null ? "" : `:${name}:${action(option)}`;
  return names.map((one) => quoted(`${variadic ? "*" : ""}${one}[${plain(help)}]${follows}`));
}

const position = ({ required, variadic }: ArgumentFacts, i: number): string =>
  variadic ? "*:" : `${i + 1}:${required ? "" : ":"}`;
const argumentSpec = (argument: ArgumentFacts, i: number): string =>
  quoted(`${position(argument, i)}${plain(argument.name)}:${action(argument)}`);

/** An option that takes a list of files goes on taking them, and so does whatever follows it. */
const listSpec = ({ arguments: given, options }: CommandFacts): readonly string[] =>
  options.some(({ variadic, file }) => variadic && file) && !given.some(({ variadic }) => variadic)
    ? [quoted("*:file:_files")]
    : [];

function commandCase(command: CommandFacts): string {
  const { name, arguments: given, options } = command;
  const specs = [...options.flatMap(optionSpec), ...given.map(argumentSpec), ...listSpec(command)];
  return `    ${name})\n      _arguments -S \\\n        ${specs.join(" \\\n        ")}\n      ;;`;
}

/** The script. */
export function zshCompletion(tree: CommandTree): string {
  const real = tree.commands.filter(({ name }) => name !== "help");
  const described = tree.commands.map(({ name, summary }) => quoted(`${name}:${summary.replaceAll(":", "\\:")}`));
  return `#compdef joulewright
# Completion of joulewright ${tree.version} for zsh. Made by: joulewright completion zsh
_joulewright() {
  local -a commands
  commands=(
    ${described.join("\n    ")}
  )
  if (( CURRENT == 2 )) && [[ $words[2] != -* ]]; then
    _describe -t commands command commands
    return
  fi
  if [[ $words[2] == -* ]]; then
    _arguments -S \\
      ${tree.options.flatMap(optionSpec).join(" \\\n      ")}
    return
  fi
  shift words
  (( CURRENT-- ))
  case $words[1] in
${real.map(commandCase).join("\n")}
    help)
      _describe -t commands command commands
      ;;
  esac
}
if [[ $funcstack[1] == _joulewright ]]; then
  _joulewright "$@"
else
  compdef _joulewright joulewright
fi
`;
}
