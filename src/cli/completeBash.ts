// A completion script for bash, version 3.2 and later.

import type { CommandFacts, CommandTree, OptionFacts } from "./commandTree.ts";

/** A word of the shell, quoted whatever stands in it. */
const quoted = (text: string): string => (/^[\w./:=-]+$/.test(text) ? text : `'${text.replaceAll("'", "'\\''")}'`);

const words = (list: readonly string[]): string => `_joulewright_words ${list.map(quoted).join(" ")}`;

const spellings = ({ long, short }: OptionFacts): readonly string[] => (short === null ? [long] : [long, short]);

/** What follows an option: its words, a file, or what nobody can know. */
function valueCases(command: CommandFacts): readonly string[] {
  return command.options
    .filter(({ value }) => value !== null)
    .map((option) => {
      const action = option.words.length > 0 ? words(option.words) : option.file ? "_joulewright_files" : ":";
      const patterns = spellings(option)
        .map((one) => `'${command.name} ${one}'`)
        .join("|");
      return `    ${patterns}) ${action}; return ;;`;
    });
}

function commandCase(command: CommandFacts): string {
  const options = command.options.flatMap(spellings);
  const listed = command.arguments.flatMap((argument) => argument.words);
  const rest =
    listed.length > 0 ? words(listed) : command.arguments.some(({ file }) => file) ? "_joulewright_files" : ":";
  return `    ${command.name}) if [[ $cur == -* ]]; then ${words(options)}; else ${rest}; fi ;;`;
}

/** The script. To be sourced: `source <(joulewright completion bash)`. */
export function bashCompletion(tree: CommandTree): string {
  const names = tree.commands.map(({ name }) => name);
  const bare: CommandFacts = { ...tree, name: "" };
  const cases = [...tree.commands.filter(({ name }) => name !== "help"), bare].flatMap(valueCases);
  return `# Completion of joulewright ${tree.version} for bash. Made by: joulewright completion bash
_joulewright_words() {
  local word
  for word in "$@"; do
    if [[ $word == "$cur"* ]]; then
      if [[ -n $quote ]]; then COMPREPLY+=("$word"); else COMPREPLY+=("$(printf %q "$word")"); fi
    fi
  done
}
_joulewright_files() {
  # Where nothing is offered, the shell offers files.
  compopt -o default -o filenames 2>/dev/null
}
_joulewright() {
  local cur=\${COMP_WORDS[COMP_CWORD]} prev=\${COMP_WORDS[COMP_CWORD - 1]} command= quote=
  COMPREPLY=()
  if [[ $cur == '=' ]]; then cur=
  elif [[ $prev == '=' ]]; then prev=\${COMP_WORDS[COMP_CWORD - 2]}; fi
  case $cur in
    \\"*|\\'*) quote=1 cur=\${cur:1} ;;
    *) cur=\${cur//\\\\/} ;;
  esac
  if ((COMP_CWORD > 1)); then
    case \${COMP_WORDS[1]} in
      ${names.join("|")}) command=\${COMP_WORDS[1]} ;;
    esac
  fi
  case "$command $prev" in
${cases.join("\n")}
  esac
  case $command in
${tree.commands
  .filter(({ name }) => name !== "help")
  .map(commandCase)
  .join("\n")}
    help) ${words(names.filter((name) => name !== "help"))} ;;
    *) if [[ $cur == -* ]]; then ${words(tree.options.flatMap(spellings))}
       elif ((COMP_CWORD == 1)); then ${words(names)}
       else _joulewright_files; fi ;;
  esac
}
complete -F _joulewright joulewright
`;
}
