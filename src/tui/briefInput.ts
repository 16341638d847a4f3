// Puts the form's texts and what the form has no field for together into one brief, and takes a brief apart again.
import { FIELDS } from "./fields.ts";

type Node = Readonly<Record<string, unknown>>;

const isNode = (value: unknown): value is Node => typeof value === "object" && value !== null && !Array.isArray(value);

export interface FormBrief {
  /** Text by key; a point in a key goes one level down. */
  readonly values: Readonly<Record<string, string>>;
  readonly extra: Node;
}

/** The brief as its reader takes it. Blank fields are left to the brief's own defaults; an odd object stays as it is, to be refused. */
export function briefInput({ values, extra }: FormBrief): Node {
  const brief: Record<string, unknown> = { ...extra };
  for (const [key, text] of Object.entries(values)) {
    if (text.trim() === "") continue;
    const [first = "", second] = key.split(".");
    const there = Object.hasOwn(brief, first) ? brief[first] : undefined;
    if (second === undefined) brief[first] = text;
    else if (there === undefined || isNode(there)) brief[first] = { ...there, [second]: text };
  }
  return brief;
}

/** A brief's values as the form holds them, and apart what the form has no field for. */
export function formValues(brief: unknown): { readonly brief: Record<string, string>; readonly extra: Node } {
  const values: Record<string, string> = {};
  const extra: Record<string, unknown> = {};
  if (!isNode(brief)) return { brief: values, extra };
  const isField = (key: string): boolean => FIELDS.some((field) => field.key === key);
  const fits = (value: unknown): value is string | number => typeof value === "string" || typeof value === "number";
  for (const [key, value] of Object.entries(brief)) {
    if (isField(key) && fits(value)) values[key] = String(value);
    else if (isNode(value) && FIELDS.some((field) => field.key.startsWith(`${key}.`))) {
      const rest = Object.entries(value).filter(([inner, one]) => {
        const path = `${key}.${inner}`;
        if (!isField(path) || !fits(one)) return true;
        values[path] = String(one);
        return false;
      });
      if (rest.length > 0 || Object.keys(value).length === 0) extra[key] = Object.fromEntries(rest);
    } else extra[key] = value;
  }
  return { brief: values, extra };
}
