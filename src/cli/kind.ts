// Which kind of table a text is, by its headings.

export const TABLE_KINDS = ["capacitors", "resistors", "fuses", "measured units", "json"] as const;
export type TableKind = (typeof TABLE_KINDS)[number];

/** The headings of a text's first line, in lower case, without their units. */
export function headingsOf(text: string): readonly string[] {
  const body = text.charCodeAt(0) === 0xfeff ? text.slice(1) : text;
  const line = /^\s*([^\r\n]{0,20000})/.exec(body)?.[1] ?? "";
  return line.split(/[,;\t]/).map((cell) => cell.replace(/"/g, "").replace(/\[.*/, "").trim().toLowerCase());
}

/** The kind that the headings speak for; capacitors when they speak for none, so that its reader says what is missing. */
export function tableKind(text: string): TableKind {
  if (/^\ufeff?\s*[{[]/.test(text)) return "json";
  const headings = headingsOf(text);
  const has = (...names: readonly string[]): boolean => names.some((name) => headings.includes(name));
  if (has("serial", "serial number")) return "measured units";
  if (has("fuse", "melting action", "clearing action")) return "fuses";
  if (has("family", "resistor") || (has("power") && !has("capacitance"))) return "resistors";
  return "capacitors";
}
