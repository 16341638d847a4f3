// The build sheet of one bank: all sections in the order that a bank is decided, built, proven and used.

import { bleedChart, costChart, voltageChart } from "./charts.ts";
import { factsOf } from "./facts.ts";
import { footerOf, titleOf } from "./heading.ts";
import type { SheetInput } from "./input.ts";
import type { Section, Sheet } from "./model.ts";
import { askedSection } from "./sections/asked.ts";
import { bleedDownSection } from "./sections/bleedDown.ts";
import { coldTestSection } from "./sections/coldTest.ts";
import { doorSection } from "./sections/door.ts";
import { faceSection, schematicSection } from "./sections/drawings.ts";
import { faultSection } from "./sections/faults.ts";
import { figuresSection } from "./sections/figures.ts";
import { hazardSection } from "./sections/hazard.ts";
import { hotTestSection } from "./sections/hotTest.ts";
import { layoutSection } from "./sections/layout.ts";
import { limitsSection } from "./sections/limits.ts";
import { openSection } from "./sections/open.ts";
import { placedSection } from "./sections/placed.ts";
import { revisionSection, shotLogSection } from "./sections/records.ts";
import { resistorSection } from "./sections/resistors.ts";
import { shotSection } from "./sections/shot.ts";
import { unitSection } from "./sections/unit.ts";
import { wiringSection } from "./sections/wiring.ts";

const withDrawing = (section: Section, drawing: Section["blocks"][number] | null): Section =>
  drawing === null ? section : { ...section, blocks: [...section.blocks, drawing] };

/** The sheet. Same input, same sheet; nothing is read, nothing is guessed. */
export function sheetOf(input: SheetInput): Sheet {
  const { layout, words, date, revision, program } = input;
  return {
    title: titleOf(input),
    layout: layout.id,
    rule: factsOf(input).rule,
    date,
    revision,
    program,
    cautions: words.cautions.map(({ text }) => text),
    footer: footerOf(input),
    sections: [
      figuresSection(input),
      openSection(input),
      askedSection(input),
      withDrawing(withDrawing(layoutSection(input), voltageChart(input)), costChart(input)),
      unitSection(input),
      schematicSection(input),
      faceSection(input),
      placedSection(input),
      wiringSection(input),
      resistorSection(input),
      withDrawing(bleedDownSection(input), bleedChart(input)),
      shotSection(input),
      faultSection(input),
      coldTestSection(input),
      hotTestSection(input),
      limitsSection(input),
      hazardSection(input),
      doorSection(input),
      shotLogSection(),
      revisionSection(input),
    ],
  };
}
