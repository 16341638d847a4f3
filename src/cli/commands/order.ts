// `order`: the bill of materials of one arrangement, to the output or to a file.

import {
  alternatesFor,
  BILL_FORMATS,
  type Bill,
  billOf,
  billText,
  type Money,
  readEditedBill,
  visible,
  withEdits,
} from "../../order/index.ts";
import { accepted, type Read } from "../../quantity/index.ts";
import { type FuseChoice, fittedFuse } from "../../search/index.ts";
import { changeLines } from "../billChanges.ts";
import { cautionsOf } from "../cautions.ts";
import { type BankFlags, checkedBank } from "../checked.ts";
import { chosenFormat } from "../chosenFormat.ts";
import { EXIT } from "../exit.ts";
import { titleOf } from "../findingWords.ts";
import { readFuseStock } from "../fuses.ts";
import { faultLines } from "../inputNotes.ts";
import { outputOf } from "../paperOutput.ts";
import type { Ports } from "../ports.ts";
import { tell } from "../tell.ts";

export type OrderFlags = BankFlags & {
  readonly format?: string;
  readonly fuses?: string;
  readonly edited?: string;
  readonly output?: string;
  readonly force?: boolean;
};

export function orderCommand(brief: string | undefined, flags: OrderFlags, ports: Ports): number {
  const format = chosenFormat(flags, BILL_FORMATS, "csv");
  const output = outputOf(flags.output);
  const checked = checkedBank(brief, flags, ports);
  if (!format.ok || !output.ok || !checked.ok) {
    const refusals = [format, output, checked].flatMap((one) => (one.ok ? [] : one.refusals));
    return tell(ports, refusals, flags.json);
  }
  const { result, unit, settings, stock, currency, notes } = checked.value;
  const cautions = cautionsOf(settings.brief, { layout: result, unit }).map(({ text }) => text);
  const { brief: asked } = settings;
  const fuses = flags.fuses === undefined ? null : readFuseStock(flags.fuses, ports.files, asked, currency);
  if (fuses !== null && !fuses.ok) return tell(ports, fuses.refusals, flags.json);
  const fuse = fuses === null ? null : fittedFuse({ layout: result, unit, brief: asked }, fuses.value.fuses);
  const { families, parts } = stock;
  const alternates = alternatesFor({ layout: result, unit, brief: asked, parts, families, currency, fuse });
  const fresh = billOf({ layout: result, unit, families, brief: asked, currency, cautions, fuse, alternates });
  const edited = editedOf(fresh, flags.edited, { currency, exchange: asked.exchange }, ports);
  if (!edited.ok) return tell(ports, edited.refusals, flags.json);
  const bill = edited.value;
  const text = billText(bill, format.value);
  const said = [
    ...faultLines(stock),
    ...(fuses?.value.lost ?? []),
    ...notes,
    ...fuseSaid(fuse),
    ...changeLines(bill, flags.edited),
  ];
  for (const finding of result.findings)
    if (finding.verdict === "fail")
      said.push(`FAIL, ${titleOf(finding.id)}: ${visible(finding.note)} Do not buy this bank.`);
  if (said.length > 0) ports.err(`${said.join("\n")}\n`);
  if (output.value === null) ports.out(text);
  else {
    const written = ports.files.write(output.value, text, flags.force === true);
    if (!written.ok) return tell(ports, written.refusals, flags.json);
    ports.err(`${visible(output.value)}: ${bill.lines.length} lines written\n`);
  }
  return result.findings.some((f) => f.verdict === "fail") ? EXIT.unsafe : EXIT.done;
}

/** The bill with what its builder wrote in an earlier copy. */
function editedOf(bill: Bill, path: string | undefined, money: Money, ports: Ports): Read<Bill> {
  if (path === undefined) return accepted(bill);
  const text = ports.files.read(path);
  if (!text.ok) return text;
  const edited = readEditedBill(text.value, path === "-" ? "standard input" : path);
  return edited.ok ? withEdits(bill, edited.value, money) : edited;
}

/** Why no fuse of the catalogue is on the bill. */
function fuseSaid(fuse: FuseChoice | null): readonly string[] {
  if (fuse === null || fuse.chosen !== null) return [];
  if (fuse.count === 0) return ["No fuses: without neighbours there is nothing to cut a failed unit off from."];
  const open = fuse.sees.normalAction === null || fuse.sees.faultAction === null;
  const why = open ? "; without a load in the brief or the units' ESR none can be judged" : "";
  return [
    `No fuse of the catalogue is proven to do${why}: the line stays to be chosen. See: joulewright pulse --fuses.`,
  ];
}
