// `order`: the bill of materials of one arrangement, to the output or to a file.

import {
  alternatesFor,
  BILL_FORMATS,
  type Bill,
  type BillFormat,
  billOf,
  billText,
  blendBillOf,
  type Money,
  readEditedBill,
  visible,
  withEdits,
} from "../../order/index.ts";
import { accepted, type Read } from "../../quantity/index.ts";
import { type FuseChoice, fittedFuse } from "../../search/index.ts";
import { changeLines } from "../billChanges.ts";
import { cautionsOf } from "../cautions.ts";
import { checkedBank } from "../checked.ts";
import { type BlendBankFlags, type CheckedBlend, checkedBlend } from "../checkedBlend.ts";
import { chosenFormat } from "../chosenFormat.ts";
import { EXIT } from "../exit.ts";
import { titleOf } from "../findingWords.ts";
import { readFuseStock } from "../fuses.ts";
import { faultLines } from "../inputNotes.ts";
import { outputOf } from "../paperOutput.ts";
import type { Ports } from "../ports.ts";
import { tell } from "../tell.ts";

export type OrderFlags = BlendBankFlags & {
  readonly format?: string;
  readonly fuses?: string;
  readonly edited?: string;
  readonly output?: string;
  readonly force?: boolean;
};

export function orderCommand(brief: string | undefined, flags: OrderFlags, ports: Ports): number {
  const format = chosenFormat(flags, BILL_FORMATS, "csv");
  const output = outputOf(flags.output);
  const mixed = checkedBlend(brief, flags, ports);
  if (!mixed.ok || mixed.value !== null) {
    if (format.ok && output.ok && mixed.ok && mixed.value !== null)
      return orderBlend(mixed.value, { format: format.value, path: output.value }, flags, ports);
    return tell(
      ports,
      [format, output, mixed].flatMap((one) => (one.ok ? [] : one.refusals)),
      flags.json,
    );
  }
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
  const lost = handOut({ text, lines: bill.lines.length, said, path: output.value }, flags, ports);
  return lost ?? (result.findings.some((f) => f.verdict === "fail") ? EXIT.unsafe : EXIT.done);
}

interface Written {
  readonly text: string;
  readonly lines: number;
  readonly said: readonly string[];
  /** Null for the output. */
  readonly path: string | null;
}

/** Writes the bill where it was asked for; the exit status when it could not be. */
function handOut({ text, lines, said, path }: Written, flags: OrderFlags, ports: Ports): number | null {
  if (said.length > 0) ports.err(`${said.join("\n")}\n`);
  if (path === null) ports.out(text);
  else {
    const written = ports.files.write(path, text, flags.force === true);
    if (!written.ok) return tell(ports, written.refusals, flags.json);
    ports.err(`${visible(path)}: ${lines} lines written\n`);
  }
  return null;
}

/** The bill of a blend. Fuses are chosen for one layout at a time. */
function orderBlend(
  checked: CheckedBlend,
  { format, path }: { readonly format: BillFormat; readonly path: string | null },
  flags: OrderFlags,
  ports: Ports,
): number {
  if (flags.edited !== undefined) {
    const want = "one layout: what its builder wrote is kept by line, and a blend has the same line for every group";
    return tell(ports, [{ code: "contradiction", place: { field: "--edited" }, read: "a blend", want }], flags.json);
  }
  if (flags.fuses !== undefined) {
    const want =
      "one layout: a fuse of a blend must clear on what all the other groups bring, which is not reckoned yet";
    return tell(ports, [{ code: "contradiction", place: { field: "--fuses" }, read: "a blend", want }], flags.json);
  }
  const { blend, units, settings, stock, currency, cautions, notes } = checked;
  const { brief } = settings;
  const bill = blendBillOf({
    blend,
    units,
    families: stock.families,
    brief,
    currency,
    cautions: cautions.map(({ text }) => text),
  });
  const findings = [...blend.findings, ...blend.strings.flatMap((one) => one.findings)];
  const fails = findings.filter((f) => f.verdict === "fail");
  const said = [
    ...faultLines(stock),
    ...notes,
    ...fails.map(({ id, note }) => `FAIL, ${titleOf(id)}: ${visible(note)} Do not buy this bank.`),
  ];
  const lost = handOut({ text: billText(bill, format), lines: bill.lines.length, said, path }, flags, ports);
  return lost ?? (fails.length > 0 ? EXIT.unsafe : EXIT.done);
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
  const open = fuse.sees.normalAction === null || fuse.sees.leastFaultAction === null;
  const why = open ? "; without a load in the brief or the units' ESR none can be judged" : "";
  return [
    `No fuse of the catalogue is proven to do${why}: the line stays to be chosen. See: joulewright pulse --fuses.`,
  ];
}
