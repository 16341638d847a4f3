// The manual page, in the macros that every man understands, made from the commands and their own help.

import { CAUTIONS, DEFERENCE } from "../hazard/index.ts";
import type { ArgumentFacts, CommandFacts, CommandTree, OptionFacts } from "./commandTree.ts";
import { HELP } from "./helpText.ts";

/** Text that the formatter shows as it is: backslashes, hyphens, leading points and quotes. */
export const roffText = (text: string): string =>
  text
    .replaceAll("\\", "\\e")
    .replaceAll("-", "\\-")
    .replaceAll("'", "\\(aq")
    .replaceAll("^", "\\(ha")
    .replaceAll("~", "\\(ti")
    .replaceAll("`", "\\(ga")
    .replace(/^(?=\.)/gm, "\\&");

const bold = (text: string): string => `\\fB${roffText(text)}\\fR`;
const italic = (text: string): string => `\\fI${roffText(text)}\\fR`;

const argumentText = ({ name, required, variadic }: ArgumentFacts): string => {
  const inner = `${italic(name)}${variadic ? "..." : ""}`;
  return required ? inner : `[${inner}]`;
};

function optionLines({ long, short, value, help, words }: OptionFacts): readonly string[] {
  const names = [short, long].filter((name): name is string => name !== null).map(bold);
  const follows = value === null ? "" : ` ${italic(value.replace(/[<>]/g, ""))}`;
  const listed =
    words.length === 0 || words.every((word) => help.includes(word)) ? "" : ` One of: ${words.join(", ")}.`;
  return [".TP", `${names.join(", ")}${follows}`, roffText(`${help}${listed}`)];
}

/** Options by their headings, the common ones first. */
function grouped(options: readonly OptionFacts[]): readonly string[] {
  const groups = [...new Set(options.map(({ group }) => group))].sort((a, b) => (a === null ? -1 : b === null ? 1 : 0));
  return groups.flatMap((group) => [
    ...(group === null ? [] : [".PP", italic(group)]),
    ...options.filter((option) => option.group === group).flatMap(optionLines),
  ]);
}

/** Help text as it stands: its lines are set by hand. */
const asSet = (text: string): readonly string[] => [".PP", ".nf", roffText(text.trim()), ".fi"];

function commandLines(command: CommandFacts): readonly string[] {
  const notes = (HELP as Readonly<Record<string, string>>)[command.name];
  const used = ["joulewright", command.name].map(bold).join(" ");
  const given = command.arguments.map(argumentText).join(" ");
  return [
    `.SS ${roffText(command.name)}`,
    `${used}${given === "" ? "" : ` ${given}`} [${italic("options")}]`,
    ".PP",
    roffText(command.summary),
    ...command.arguments
      .filter(({ help }) => help !== "")
      .flatMap((one) => [".TP", argumentText(one), roffText(one.help)]),
    ...grouped(command.options.filter(({ long }) => long !== "--help")),
    ...(notes === undefined ? [] : asSet(notes)),
  ];
}

const STATUS: readonly (readonly [string, string])[] = [
  ["0", "Done."],
  ["1", "No layout is possible, or a check failed, or the output could not be written whole."],
  ["2", "Wrong use, or input that cannot be read; what was read and what would be accepted is told."],
  ["70", "A bug of ours, with how to report it."],
];

const ENVIRONMENT: readonly (readonly [string, string])[] = [
  ["NO_COLOR", "Set and not empty: no colour on the screens; nothing is said by colour alone."],
  ["COLUMNS", "Width of text where the terminal does not tell it."],
  ["JOULEWRIGHT_SESSION", "File in which the screens keep brief and pins, in place of ~/.joulewright.json."],
];

const pairs = (rows: readonly (readonly [string, string])[]): readonly string[] =>
  rows.flatMap(([name, text]) => [".TP", bold(name), roffText(text)]);

/** The page, section 1. No date stands on it, so that the same program gives the same page. */
export function manualPage(tree: CommandTree): string {
  const lines = [
    `.TH JOULEWRIGHT 1 "" "joulewright ${tree.version}" "User Commands"`,
    ".SH NAME",
    `joulewright \\- ${roffText(tree.summary.replace(/^./, (letter) => letter.toLowerCase()).replace(/\.$/, ""))}`,
    ".SH SYNOPSIS",
    `${bold("joulewright")} [${italic("options of the screens")}]`,
    ".br",
    `${bold("joulewright")} ${italic("command")} [${italic("argument")}...] [${italic("options")}]`,
    ".SH DESCRIPTION",
    roffText(tree.summary),
    "Without a command the screens open; where there is no terminal the plan of the demo brief is printed.",
    `Every command prints text for people, or JSON in SI units with ${bold("--json")}.`,
    "A flag beats the brief file, which beats the defaults.",
    ".PP",
    `${bold("A charged bank can kill with its supply switched off and unplugged.")} ${roffText(DEFERENCE[0]?.long ?? "")}`,
    ".SH OPTIONS",
    ...grouped(tree.options),
    ".SH COMMANDS",
    ...tree.commands.flatMap(commandLines),
    ".SH EXIT STATUS",
    ...pairs(STATUS),
    ".SH ENVIRONMENT",
    ...pairs(ENVIRONMENT),
    ".SH FILES",
    ".TP",
    bold("~/.joulewright.json"),
    "What the screens had when they were left: brief, pins and place. It may be deleted.",
    ".SH CAUTIONS",
    ...[...CAUTIONS.filter(({ when }) => when === "always"), ...DEFERENCE].flatMap(({ long }) => [
      ".PP",
      roffText(long),
    ]),
  ];
  return `${lines.join("\n")}\n`;
}
