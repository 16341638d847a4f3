// The sheet as Markdown: text of unknown origin can end no cell, start no HTML and form no link; a drawing is its words.

import { markdownText } from "../order/index.ts";
import type { Block, Section, Sheet, Table } from "./model.ts";

/** A blank to write on. */
const BLANK = "\\_\\_\\_\\_\\_\\_";

const row = (cells: readonly string[]): string => `| ${cells.join(" | ")} |`;

function tableText({ caption, columns, rows }: Table): string {
  return [
    `**${markdownText(caption)}**`,
    "",
    row(columns.map(({ heading }) => markdownText(heading))),
    row(columns.map(({ side }) => (side === "right" ? "---:" : "---"))),
    ...rows.map((cells) => row(cells.map((cell) => (cell === null ? BLANK : markdownText(cell))))),
  ].join("\n");
}

/** A line that begins like a heading, a list or a quote is only text: its first mark is escaped. */
const paragraph = (words: string): string => markdownText(words).replace(/^(\s*)([-=>]|\d+(?=[.)]))/, "$1&#8203;$2");

function blockText(block: Block): string {
  switch (block.kind) {
    case "text":
      return paragraph(block.text);
    case "list":
      return block.items.map((item) => `- ${paragraph(item)}`).join("\n");
    case "table":
      return tableText(block);
    case "drawing":
      return `*${markdownText(block.drawn.props.title)}* (drawn in the HTML sheet). ${markdownText(block.words)}`;
  }
}

const sectionText = ({ title, blocks }: Section): string =>
  [`## ${markdownText(title)}`, ...blocks.map(blockText)].join("\n\n");

/** The whole sheet, ending in a line break. */
export function sheetToMarkdown(sheet: Sheet): string {
  const { title, layout, rule, date, revision, program, cautions, footer, sections } = sheet;
  const head = [
    `# Build sheet: ${markdownText(title)}`,
    row(["layout", "rule that governs", "revision", "date", "made with"]),
    row(["---", "---", "---", "---", "---"]),
    row([layout, rule, revision, date, program].map((cell) => (cell === null ? BLANK : markdownText(cell)))),
  ];
  return `${[
    head[0],
    head.slice(1).join("\n"),
    cautions.map((caution) => `- ${paragraph(caution)}`).join("\n"),
    ...sections.map(sectionText),
    "---",
    footer.map(markdownText).join(" "),
  ].join("\n\n")}\n`;
}
