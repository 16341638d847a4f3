// `order`: the bill of materials of one arrangement, to the output or to a file.

import { BILL_FORMATS, type BillFormat, billOf, billText, blendBillOf, visible } from "../../order/index.ts";
import { nearestWord, type Refusal } from "../../quantity/index.ts";
import { type FuseChoice, fittedFuse } from "../../search/index.ts";
import { cautionsOf } from "../cautions.ts";
import { checkedBank } from "../checked.ts";
import { type BlendBankFlags, type CheckedBlend, checkedBlend } from "../checkedBlend.ts";
import { EXIT } from "../exit.ts";
import { titleOf } from "../findingWords.ts";
import { readFuseStock } from "../fuses.ts";
import { faultLines } from "../inputNotes.ts";
import type { Ports } from "../ports.ts";
import { tell } from "../tell.ts";

export type OrderFlags = BlendBankFlags & {
  readonly format?: string;
  readonly fuses?: string;
  readonly output?: string;
  readonly force?: boolean;
};

export function orderCommand(brief: string | undefined, flags: OrderFlags, ports: Ports): number {
  const format = readFormat(flags);
  if (flags.output?.trim() === "") {
    const want = "the name of a file; - for the output";
    return tell(
      ports,
      [{ code: "empty", place: { field: "--output" }, read: JSON.stringify(flags.output), want }],
      flags.json,
    );
  }
  const mixed = checkedBlend(brief, flags, ports);
  if (!mixed.ok) return tell(ports, [...(typeof format === "string" ? [] : [format]), ...mixed.refusals], flags.json);
  if (mixed.value !== null && typeof format === "string") return orderBlend(mixed.value, format, flags, ports);
  const checked = checkedBank(brief, flags, ports);
  if (!checked.ok || typeof format !== "string") {
    const faults = [...(typeof format === "string" ? [] : [format]), ...(checked.ok ? [] : checked.refusals)];
    return tell(ports, faults, flags.json);
  }
  const { result, unit, settings, stock, currency, notes } = checked.value;
  const cautions = cautionsOf(settings.brief, { layout: result, unit }).map(({ text }) => text);
  const { brief: asked } = settings;
  const fuses = flags.fuses === undefined ? null : readFuseStock(flags.fuses, ports.files, asked, currency);
  if (fuses !== null && !fuses.ok) return tell(ports, fuses.refusals, flags.json);
  const fuse = fuses === null ? null : fittedFuse({ layout: result, unit, brief: asked }, fuses.value.fuses);
  const bill = billOf({ layout: result, unit, families: stock.families, brief: asked, currency, cautions, fuse });
  const text = billText(bill, format);
  const said = [...faultLines(stock), ...(fuses?.value.lost ?? []), ...notes, ...fuseSaid(fuse)];
  for (const finding of result.findings)
    if (finding.verdict === "fail")
      said.push(`FAIL, ${titleOf(finding.id)}: ${visible(finding.note)} Do not buy this bank.`);
  const lost = handOut({ text, lines: bill.lines.length, said }, flags, ports);
  return lost ?? (result.findings.some((f) => f.verdict === "fail") ? EXIT.unsafe : EXIT.done);
}

/** Writes the bill where it was asked for; the exit status when it could not be. */
function handOut(
  { text, lines, said }: { readonly text: string; readonly lines: number; readonly said: readonly string[] },
  flags: OrderFlags,
  ports: Ports,
): number | null {
  if (said.length > 0) ports.err(`${said.join("\n")}\n`);
  if (flags.output === undefined || flags.output === "-") ports.out(text);
  else {
    const written = ports.files.write(flags.output, text, flags.force === true);
    if (!written.ok) return tell(ports, written.refusals, flags.json);
    ports.err(`${visible(flags.output)}: ${lines} lines written\n`);
  }
  return null;
}

/** The bill of a blend. Fuses are chosen for one layout at a time. */
function orderBlend(checked: CheckedBlend, format: BillFormat, flags: OrderFlags, ports: Ports): number {
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
  const lost = handOut({ text: billText(bill, format), lines: bill.lines.length, said }, flags, ports);
  return lost ?? (fails.length > 0 ? EXIT.unsafe : EXIT.done);
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

/** The format named, else that of the file's ending, else CSV; --json is the format json. */
function readFormat({ format, json, output }: OrderFlags): BillFormat | Refusal {
  const ending = /\.([a-z]+)$/i
    .exec(output ?? "")?.[1]
    ?.toLowerCase()
    .replace(/^htm$/, "html")
    .replace(/^markdown$/, "md");
  const named = format?.toLowerCase() ?? (json ? "json" : undefined);
  const wanted = named ?? BILL_FORMATS.find((one) => one === ending) ?? "csv";
  const found = BILL_FORMATS.find((one) => one === wanted);
  if (found !== undefined) return found;
  const near = nearestWord(wanted, BILL_FORMATS);
  const want = `${near === null ? "" : `perhaps ${JSON.stringify(near)}; `}one of ${BILL_FORMATS.join(", ")}`;
  return { code: "bad-choice", place: { field: "--format" }, read: JSON.stringify(wanted), want };
}
