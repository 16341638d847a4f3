// The commands with their options as plain data, read from the program itself: what completions and the manual are made from.

import type { Argument, Command, Option } from "commander";
import { SHELLS, wordsOf } from "./flagWords.ts";

export interface OptionFacts {
  /** `--energy`. */
  readonly long: string;
  /** `-V`; null for most. */
  readonly short: string | null;
  /** What stands for its value, `<file...>`; null where it takes none. */
  readonly value: string | null;
  readonly variadic: boolean;
  readonly file: boolean;
  readonly words: readonly string[];
  readonly help: string;
  /** Heading that it stands under; null for the common one. */
  readonly group: string | null;
}

export interface ArgumentFacts {
  readonly name: string;
  readonly required: boolean;
  readonly variadic: boolean;
  readonly file: boolean;
  readonly words: readonly string[];
  readonly help: string;
}

export interface CommandFacts {
  readonly name: string;
  readonly summary: string;
  readonly arguments: readonly ArgumentFacts[];
  readonly options: readonly OptionFacts[];
}

export interface CommandTree extends CommandFacts {
  readonly version: string;
  readonly commands: readonly CommandFacts[];
}

const FILES = ["brief", "files", "sheet"];

function argumentFacts(argument: Argument): ArgumentFacts {
  const name = argument.name();
  return {
    name,
    required: argument.required,
    variadic: argument.variadic,
    file: FILES.includes(name),
    words: name === "shell" ? SHELLS : [],
    help: argument.description,
  };
}

function optionFacts(command: string, option: Option): OptionFacts {
  const value = /<[^>]*>/.exec(option.flags)?.[0] ?? null;
  const long = option.long ?? option.flags;
  return {
    long,
    short: option.short ?? null,
    value,
    variadic: option.variadic,
    file: value?.includes("file") === true || long === "--pins",
    words: wordsOf(command, long),
    help: option.description,
    group: option.helpGroupHeading?.replace(/:$/, "") ?? null,
  };
}

const HELP_OPTION: OptionFacts = {
  long: "--help",
  short: "-h",
  value: null,
  variadic: false,
  file: false,
  words: [],
  help: "display help for command",
  group: null,
};

function factsOf(command: Command): CommandFacts {
  return {
    name: command.name(),
    summary: command.description(),
    arguments: command.registeredArguments.map(argumentFacts),
    options: [...command.options.map((option) => optionFacts(command.name(), option)), HELP_OPTION],
  };
}

const screen = (long: string, value: string | null, help: string): OptionFacts => ({
  ...HELP_OPTION,
  long,
  short: null,
  value,
  variadic: long === "--catalog",
  file: value !== null,
  help,
});

/** Options of the screens, which open when there is no command; they are read before the program is. A test holds them together. */
export const SCREEN_OPTIONS: readonly OptionFacts[] = [
  screen("--catalog", "<file...>", "capacitor catalogues of the screens, CSV; else the invented demo catalogues"),
  screen("--resistors", "<file>", "resistor catalogue of the screens, CSV"),
  screen("--brief", "<file>", "brief that the screens open with, JSON"),
  screen("--ascii", null, "draw the screens in plain ASCII"),
  screen("--dark", null, "colours for a dark ground, when the terminal does not tell its own"),
  screen("--light", null, "colours for a light ground"),
];

/** Everything that can be typed. */
export function treeOf(program: Command): CommandTree {
  const own = factsOf(program);
  const help: CommandFacts = { name: "help", summary: "Display help for a command.", arguments: [], options: [] };
  return {
    ...own,
    options: [...SCREEN_OPTIONS, ...own.options],
    version: program.version() ?? "",
    commands: [...program.commands.map(factsOf), help],
  };
}
