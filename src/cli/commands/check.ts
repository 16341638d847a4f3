// `check`: one arrangement in every state that can be assessed at rest.

import { leftAfterDump } from "../../bank/index.ts";
import { visible } from "../../order/index.ts";
import { formatQuantity } from "../../quantity/index.ts";
import { askedText } from "../askedText.ts";
import { cautionsOf } from "../cautions.ts";
import { type BankFlags, type Checked, checkedBank } from "../checked.ts";
import { EXIT } from "../exit.ts";
import { faultsText } from "../faultsText.ts";
import { faultLines, inputSentences, inputsJson } from "../inputNotes.ts";
import { joinedFacts } from "../joined.ts";
import { hanging, layoutText } from "../layoutText.ts";
import type { Ports } from "../ports.ts";
import { tell } from "../tell.ts";
import { toJson } from "../toJson.ts";
import { bullet, wrap } from "../wrap.ts";

export function checkCommand(brief: string | undefined, flags: BankFlags, ports: Ports): number {
  const checked = checkedBank(brief, flags, ports);
  if (!checked.ok) return tell(ports, checked.refusals, flags.json);
  const lines = faultLines(checked.value.stock);
  if (lines.length > 0) ports.err(`${lines.join("\n")}\n`);
  ports.out(flags.json ? checkJson(checked.value) : checkText(checked.value, ports.columns));
  return checked.value.result.findings.some((f) => f.verdict === "fail") ? EXIT.unsafe : EXIT.done;
}

/** What the lowest and the highest stage keep after a dump, V, signed; null when the tolerance is unknown. */
function leftOf({ result, unit, settings }: Checked): { readonly low: number | null; readonly high: number | null } {
  const { brief } = settings;
  if (result.series === 1) return { low: 0, high: 0 };
  if (unit.tolerance === undefined) return { low: null, high: null };
  return leftAfterDump(brief.voltage * (1 + brief.overshoot), result.series, unit.tolerance);
}

function checkJson(checked: Checked): string {
  const { result, unit, settings, stock, notes } = checked;
  const { brief } = settings;
  return toJson({
    ...result,
    left: leftOf(checked),
    ...joinedFacts({ layout: result, unit, brief }),
    brief,
    notes,
    cautions: cautionsOf(brief, { layout: result, unit }),
    inputs: inputsJson(settings, stock),
  });
}

function checkText(checked: Checked, width: number): string {
  const { result, unit, settings, stock, notes } = checked;
  const left = leftOf(checked);
  const volts = (x: number | null): string => formatQuantity(x, "voltage");
  const kept =
    left.low === null
      ? "not assessed: the tolerance is unknown"
      : `${volts(left.low)} to ${volts(left.high)} on a stage`;
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
    `${visible(result.id)}\n\nAsked\n${askedText(settings.brief, settings.given, width)}`,
    `Found\n${layoutText(result, unit, width)}`,
    hanging("left after a dump", kept, width),
    `If one thing fails\n${faultsText(joinedFacts({ layout: result, unit, brief: settings.brief }).faults, width)}`,
    verdict,
    ...[...inputSentences(stock), ...notes].map((text) => wrap(text, width)),
    ["Cautions", ...cautions.map(({ text }) => bullet(text, width))].join("\n"),
  ];
  return `${blocks.join("\n\n")}\n`;
}
