// Small catalogues for the tests of blends: a few columns, everything known unless a row says otherwise.
import {
  type Capacitor,
  DEFAULT_FAMILY,
  type ResistorFamily,
  readCapacitors,
  readResistors,
} from "../../src/catalog/index.ts";
import { type BlendWork, blendWork } from "../../src/search/blendOptions.ts";
import { type BlendInput, planBlends } from "../../src/search/blends.ts";
import type { Brief, BriefInput } from "../../src/search/index.ts";
import { briefOf, must } from "./labParts.ts";
import { slowRequired } from "./slowPlan.ts";

const HEADING =
  "part;polarised;capacitance [uF];voltage [V];tolerance [%];leakage [uA];diameter [mm];length [mm];mass [g];price;price breaks;pack;" +
  "minimum order;on hand;available;supplier;currency";

interface Row {
  readonly [column: string]: string | number | undefined;
}
const KNOWN: Row = {
  polarised: "no",
  capacitance: 100,
  voltage: 450,
  tolerance: 10,
  leakage: 20,
  diameter: 40,
  length: 60,
  mass: 100,
  price: 5,
  currency: "EUR",
};

/** One row a part, named a, b, c ... */
export function rowsOf(...rows: readonly Row[]): string {
  const columns = HEADING.split(";").map((heading) => heading.replace(/ \[.*/, ""));
  const lines = rows.map((row, at) => {
    const full: Row = { part: String.fromCharCode(97 + at), ...KNOWN, ...row };
    return columns.map((column) => full[column] ?? "").join(";");
  });
  return [HEADING, ...lines].join("\n");
}

export const partsOf = (...rows: readonly Row[]): readonly Capacitor[] => {
  const read = must(readCapacitors(rowsOf(...rows), "lab.csv"));
  if (read.faults.length > 0) throw new Error(JSON.stringify(read.faults));
  return read.parts;
};

/** One family at 10 cents apiece, in tens. */
export const priced: readonly ResistorFamily[] = must(
  readResistors("family,tolerance [%],power [W],voltage [V],price,currency,pack\nlab,5,2,350,0.10,EUR,10", "r.csv"),
).families;

export const termsOf = (brief: Brief, families: readonly ResistorFamily[] = [DEFAULT_FAMILY], lineCost = 0) => ({
  brief,
  families,
  lineCost,
});

export function workOf(parts: readonly Capacitor[], brief: Brief, maxTypes = 4, families = priced): BlendWork {
  return blendWork({ parts, terms: termsOf(brief, families), required: slowRequired(brief), maxTypes });
}

/** Plans blends of these parts; energy by capacitance, so that counts are plain: C in uF at 400 V, full dump, nominal unless told. */
export async function blendsOf(
  parts: readonly Capacitor[],
  microfarads: number,
  more: Partial<BlendInput> & { readonly asked?: Partial<BriefInput> } = {},
) {
  const { asked, ...rest } = more;
  const brief = briefOf({ energy: (microfarads * 1e-6 * 400 ** 2) / 2, voltage: 400, basis: "nominal", ...asked });
  return must(await planBlends({ brief, parts, families: priced, clock: () => performance.now(), ...rest }));
}
