// The hazard file: the class, what every rule says and when the bank clears it, what comes back, the ways to empty it, distances.
//
// The stricter tier holds, at or over counts, and arc blast is a flag apart. Limits from memory are to be confirmed.

import { dumpDuty, dumpWindow, ruleOf } from "../../hazard/index.ts";
import { cell, said, up } from "../cells.ts";
import { type Facts, factsOf } from "../facts.ts";
import { governedLines } from "../governed.ts";
import type { SheetInput } from "../input.ts";
import { type Block, list, type Section, text } from "../model.ts";
import { rangeWords, recoveryOf } from "../recovery.ts";
import { READ, ruleName } from "../rules.ts";
import { clearWords, pathCount } from "../ways.ts";
import { clearanceBlocks } from "./clearances.ts";
import { classTable } from "./hazardClasses.ts";
import { ruleTable } from "./hazardRules.ts";

function dumpBlock({ capacitance, voltage, clear, allowed, dump, stored }: Facts): Block {
  if (capacitance === null || stored === null)
    return text("Dump resistor: not sized, because the tolerance of the unit is not known.");
  const needs = `It must bear ${up(stored, "energy")} in one go and ${up(voltage, "voltage")}; it is chosen by joules and volts, not by watts.`;
  if (dump !== null) {
    const duty = dumpDuty({ capacitance, voltage, resistance: dump });
    return text(
      `Dump resistor of ${cell(dump, "resistance")}: ${up(duty.energy, "energy")} in one go, ${up(duty.peakCurrent, "current")} and ${up(duty.peakVoltage, "voltage")} at its first moment, ${up(duty.peakPower, "power")} for that moment, time constant ${up(duty.timeConstant, "time")}. ${needs}`,
    );
  }
  if (allowed === null)
    return text(`Dump resistor: its resistance is blank, and the governing rule gives no time to size it by. ${needs}`);
  const window = dumpWindow({
    capacitance,
    voltage,
    safeVoltage: clear,
    seconds: allowed,
    peakCurrent: Number.MAX_VALUE,
  });
  return text(
    `Dump resistor: its resistance is blank. To reach ${cell(clear, "voltage")} within ${cell(allowed, "time")} it is at most ${cell(window?.most, "resistance", "down")}; its peak current is the voltage over it. ${needs}`,
  );
}

export function hazardSection(input: SheetInput): Section {
  const facts = factsOf(input);
  const back = recoveryOf(input, facts);
  const paths = pathCount(facts);
  const governs =
    input.rule === null
      ? `No rule was chosen: the times on this sheet go down to ${clearWords(facts)}. The person responsible chooses the rule that applies.`
      : `${ruleName(input.rule)} governs the times on this sheet, by the user's choice (${READ[ruleOf(input.rule).tag]}). Whether it is the right rule for this place is for the person responsible to say.`;
  return {
    id: "hazard",
    title: "Hazard file",
    ownPage: true,
    blocks: [
      text(governs),
      ...governedLines(input).map((line) => text(line)),
      classTable(facts),
      text(
        back === null
          ? "Recovery voltage after a short: not assessed, because the tolerance of the unit is not known."
          : `Recovery voltage after a short: ${rangeWords(back)}, ${said(up(back.energy, "energy"))} at the most${back.hazardous ? ", HAZARDOUS by stored energy" : ""}. ${ruleOf(back.ruleId).words} (${back.tag})`,
      ),
      text(
        `Ways to empty the bank without a hand: ${paths.count}. ${paths.words}. Two independent ways are wanted, each proven with the power off; neither is trusted.`,
      ),
      dumpBlock(facts),
      ruleTable(input, facts),
      ...clearanceBlocks(facts.voltage),
      list([
        "Second hand: read in a public page that quotes the text. Memory: neither. Neither may stand in a safety file unread.",
        "Limits and classes differ between bodies; where two tiers hold the stricter is taken.",
      ]),
    ],
  };
}
