// `check`: one arrangement in every state that can be assessed at rest.

import { leftAfterDump } from "../../bank/index.ts";
import { visible } from "../../order/index.ts";
import { formatQuantity } from "../../quantity/index.ts";
import { type BankCorners, heldWords } from "../../search/index.ts";
import { askedText } from "../askedText.ts";
import { cautionsOf } from "../cautions.ts";
import { type BankFlags, type Checked, checkedBank } from "../checked.ts";
import { type BlendBankFlags, checkedBlend } from "../checkedBlend.ts";
import { cornerLines } from "../cornerLines.ts";
import { courseText } from "../courseText.ts";
import { EXIT } from "../exit.ts";
import { faultsText } from "../faultsText.ts";
import { improveText } from "../improveText.ts";
import { faultLines, inputSentences, inputsJson } from "../inputNotes.ts";
import { joinedFacts, restFacts } from "../joined.ts";
import { LAYOUT_VERSION } from "../layoutInput.ts";
import { hanging, layoutText } from "../layoutText.ts";
import type { Ports } from "../ports.ts";
import { clampWords, riskWords, spreadWords } from "../restText.ts";
import { tell } from "../tell.ts";
import { toJson } from "../toJson.ts";
import { readWitness, unwitnessed, type Witness, type WitnessFlags, witnessOf } from "../witness.ts";
import { bullet, wrap } from "../wrap.ts";

export type CheckFlags = BlendBankFlags & WitnessFlags;

export function checkCommand(brief: string | undefined, flags: BankFlags, ports: Ports): number {
  const checked = checkedBank(brief, flags, ports);
  if (!checked.ok) return tell(ports, checked.refusals, flags.json);
  return printed(checked.value, flags, ports, null);
}

/** `check` with a counted witness when one is asked for. */
export async function checkWitnessed(brief: string | undefined, flags: CheckFlags, ports: Ports): Promise<number> {
  const ask = readWitness(flags);
  if (!ask.ok) return tell(ports, ask.refusals, flags.json);
  const mixed = checkedBlend(brief, flags, ports);
  if (!mixed.ok) return tell(ports, mixed.refusals, flags.json);
  if (mixed.value !== null) {
    if (ask.value === null) return (await import("./checkBlend.ts")).blendChecked(mixed.value, flags.json, ports);
    const want = "one layout: a blend shares safely in the worst case, so there is no chance to draw";
    return tell(ports, [{ code: "contradiction", place: { field: "--witness" }, read: "a blend", want }], flags.json);
  }
  if (ask.value === null) return checkCommand(brief, flags, ports);
  const checked = checkedBank(brief, flags, ports);
  if (!checked.ok) return tell(ports, checked.refusals, flags.json);
  const why = unwitnessed(checked.value);
  if (why !== null) {
    const want = "a bank whose chance can be drawn";
    return tell(ports, [{ code: "contradiction", place: { field: "--witness" }, read: why, want }], flags.json);
  }
  const witness = await witnessOf(checked.value, ask.value, ports);
  if (witness === null) {
    ports.err("Interrupted: the witness is not complete, and nothing of it is used.\n");
    return EXIT.unsafe;
  }
  return printed(checked.value, flags, ports, witness);
}

function printed(checked: Checked, flags: BankFlags, ports: Ports, witness: Witness | null): number {
  const lines = faultLines(checked.stock);
  if (lines.length > 0) ports.err(`${lines.join("\n")}\n`);
  ports.out(flags.json ? checkJson(checked, witness) : checkText(checked, ports.columns, witness));
  return checked.result.findings.some((f) => f.verdict === "fail") ? EXIT.unsafe : EXIT.done;
}

/** What the lowest and the highest stage keep after a dump, V, signed; null when the tolerance is unknown. */
function leftOf({ result, unit, settings }: Checked): { readonly low: number | null; readonly high: number | null } {
  const { brief } = settings;
  if (result.series === 1) return { low: 0, high: 0 };
  if (unit.tolerance === undefined) return { low: null, high: null };
  return leftAfterDump(brief.voltage * (1 + brief.overshoot), result.series, unit.tolerance);
}

/** What the hold itself adds to that, where it is worse. */
function keptAfterHold(held: BankCorners["dumpedFromHold"], low: number): string {
  if (held === null || held.voltage >= low) return "";
  return `; down to ${formatQuantity(held.voltage, "voltage", { rounding: "down" })} from ${heldWords(held.hold)}`;
}

function checkJson(checked: Checked, witness: Witness | null): string {
  const { result, unit, settings, stock, notes } = checked;
  const { brief } = settings;
  return toJson({
    version: LAYOUT_VERSION,
    ...result,
    left: leftOf(checked),
    ...joinedFacts({ layout: result, unit, brief }),
    ...restFacts(checked),
    ...(witness === null ? {} : { witness }),
    brief,
    notes,
    cautions: cautionsOf(brief, { layout: result, unit }),
    inputs: inputsJson(settings, stock),
  });
}

function checkText(checked: Checked, width: number, witness: Witness | null): string {
  const { course, clamp, corners, improve, spread } = restFacts(checked);
  const { result, unit, settings, stock, notes } = checked;
  const left = leftOf(checked);
  const volts = (x: number | null): string => formatQuantity(x, "voltage");
  const kept =
    left.low === null
      ? "not assessed: the tolerance is unknown"
      : `${volts(left.low)} to ${volts(left.high)} on a stage, from equal sharing${keptAfterHold(corners.dumpedFromHold, left.low)}`;
  const fails = result.findings.filter((f) => f.verdict === "fail").length;
  const open = result.findings.filter((f) => f.verdict === "not assessed").length;
  const verdict =
    fails > 0
      ? `${fails} CHECKS FAILED.`
      : open > 0
        ? `No check failed; ${open} could not be assessed.`
        : "No check failed.";
  const cautions = cautionsOf(settings.brief, { layout: result, unit });
  const blocks = [
    `${visible(result.id)}\n\nAsked\n${askedText(settings.brief, settings.given, width, checked.lot?.length ?? null)}`,
    `Found\n${layoutText(result, unit, width)}`,
    [
      ...cornerLines(corners, width),
      hanging("left after a dump", kept, width),
      ...(clamp === null ? [] : [hanging("clamp diodes", clampWords(clamp), width)]),
      ...(spread === null ? [] : [hanging("likely worst", spreadWords(spread), width)]),
      ...(result.risk === undefined ? [] : [hanging("chance of excess", riskWords(result, witness), width)]),
    ].join("\n"),
    ...(course === null ? [] : [`Time course at the worst corner\n${courseText(course, width)}`]),
    ...(improve === null ? [] : [`What eats the margin\n${improveText(improve, checked.currency, width)}`]),
    `If one thing fails\n${faultsText(joinedFacts({ layout: result, unit, brief: settings.brief }).faults, width)}`,
    verdict,
    ...[...inputSentences(stock), ...notes].map((text) => wrap(text, width)),
    ["Cautions", ...cautions.map(({ text }) => bullet(text, width))].join("\n"),
  ];
  return `${blocks.join("\n\n")}\n`;
}
