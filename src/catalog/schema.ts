// The schema of a capacitor handed over as data rather than text: the ranges of the catalogue's columns, in SI.

import * as z from "zod";
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import { CAPACITOR_COLUMNS, type Capacitor } from "./capacitor.ts";
import type { ColumnKind } from "./column.ts";

const tolerance = z.strictObject({ low: z.number().min(0).lt(1), high: z.number().min(0).max(1) });
const breaks = z.array(z.strictObject({ from: z.number().int().min(1), price: z.number().min(0) }));

/** The schema of one column's value. */
function valueSchema(type: ColumnKind): z.ZodType {
  switch (type.kind) {
    case "quantity":
      return z.number().min(type.least).max(type.most);
    case "whole":
      return z.number().int().min(type.least).max(type.most);
    case "tolerance":
      return tolerance;
    case "text":
      return z.string().max(type.longest);
    case "yes-no":
      return z.boolean();
    case "price":
      return z.number().min(0);
    case "price-breaks":
      return breaks;
    case "currency":
      return z.string().regex(/^[A-Z]{3}$/);
    case "choice":
      return z.enum(type.among as [string, ...string[]]);
  }
}

const NEEDED = ["part", "capacitance", "voltage"];

/** One capacitor: the values of `Capacitor` in SI, prices in minor units. Keys that are no column are refused. */
export const capacitorSchema = z.strictObject({
  ...Object.fromEntries(
    CAPACITOR_COLUMNS.filter(({ key }) => key !== "measured" && key !== "assumed").map(({ key, type }) => [
      key,
      NEEDED.includes(key) ? valueSchema(type) : valueSchema(type).optional(),
    ]),
  ),
  states: z.record(z.string(), z.looseObject({ state: z.enum(["datasheet", "measured", "assumed"]) })).default({}),
  file: z.string().default("data"),
  line: z.number().int().default(0),
});

/** Checks one capacitor given as data (a library's caller, a saved override). Every fault is told with its key. */
export function readCapacitorData(input: unknown): Read<Capacitor> {
  const result = capacitorSchema.safeParse(input);
  if (result.success) return accepted(result.data as unknown as Capacitor);
  const faults: Refusal[] = result.error.issues.map((issue) => {
    const field = issue.path.map(String).join(".");
    const read = JSON.stringify((input as Record<string, unknown> | null)?.[String(issue.path[0])]) ?? "nothing";
    return { code: "bad-value", place: field === "" ? {} : { field }, read, want: issue.message };
  });
  return refused(...faults);
}
