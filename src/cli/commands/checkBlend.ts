// `check` of a blend: every group in every state at rest, and the bank that they make.

import { askedText } from "../askedText.ts";
import { blendFaultsText } from "../blendFaultsText.ts";
import { wholeText } from "../blendText.ts";
import type { CheckedBlend } from "../checkedBlend.ts";
import { EXIT } from "../exit.ts";
import { faultLines, inputSentences, inputsJson } from "../inputNotes.ts";
import { lastLine } from "../lastLine.ts";
import type { Ports } from "../ports.ts";
import { toJson } from "../toJson.ts";
import { bullet, wrap } from "../wrap.ts";

export function blendChecked(checked: CheckedBlend, json: boolean | undefined, ports: Ports): number {
  const lines = faultLines(checked.stock);
  if (lines.length > 0) ports.err(`${lines.join("\n")}\n`);
  ports.out(json ? blendJson(checked) : blendText(checked, ports.columns));
  return findingsOf(checked).some((f) => f.verdict === "fail") ? EXIT.unsafe : EXIT.done;
}

const findingsOf = ({ blend }: CheckedBlend) => [...blend.findings, ...blend.strings.flatMap((one) => one.findings)];

function blendJson({ blend, faults, settings, stock, notes, cautions }: CheckedBlend): string {
  return toJson({ ...blend, faults, brief: settings.brief, notes, cautions, inputs: inputsJson(settings, stock) });
}

function blendText(checked: CheckedBlend, width: number): string {
  const { blend, faults, settings, stock, notes, cautions } = checked;
  const findings = findingsOf(checked);
  const blocks = [
    `Asked\n${askedText(settings.brief, settings.given, width)}`,
    wholeText("Blend", blend, width),
    `If one thing fails\n${blendFaultsText(faults, width)}`,
    wrap(lastLine(findings, faults), width),
    ...[...inputSentences(stock), ...notes].map((text) => wrap(text, width)),
    ["Cautions", ...cautions.map(({ text }) => bullet(text, width))].join("\n"),
  ];
  return `${blocks.join("\n\n")}\n`;
}
