// What every paper of a bank is headed and closed with.

import type { SheetInput } from "./input.ts";

/** Cautions that stand on every page, by their ids; the others stand at the head. */
const EVERY_PAGE = ["kills-when-off", "measure-then-short", "not-approval", "local-codes"];

export const titleOf = ({ brief }: Pick<SheetInput, "brief">): string => brief.title ?? "Capacitor bank";

export const footerOf = ({ words }: Pick<SheetInput, "words">): readonly string[] =>
  EVERY_PAGE.flatMap((id) => words.cautions.filter((caution) => caution.id === id)).map(({ text }) => text);
