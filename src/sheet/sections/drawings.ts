// The schematic and the bank face: what is drawn, from what the brief says, with blanks where it says nothing.

import { clampOf } from "../../search/index.ts";
import { cell, said } from "../cells.ts";
import { type DrawnLoad, FACE_PIECE, type Isolation, type SchematicProps } from "../draw/index.ts";
import { factsOf } from "../facts.ts";
import type { SheetInput } from "../input.ts";
import { type Section, text } from "../model.ts";
import { barsOf, groupWord, positionWord } from "../names.ts";
import { sparesShown } from "./placed.ts";

/** The load's symbol; the coil of a lamp stands beside it. */
function loadOf({ brief, words }: SheetInput): DrawnLoad {
  const { load } = brief;
  const kind =
    load === undefined
      ? "unknown"
      : load.lamp
        ? "lamp"
        : load.short
          ? "short"
          : load.inductance !== undefined
            ? "coil"
            : load.resistance !== undefined
              ? "resistor"
              : "unknown";
  return { kind, words: words.load, coil: kind === "lamp" && load?.inductance !== undefined };
}

/** A supply behind a resistor brings its isolation with it; else it is still to be chosen. */
function isolationOf({ brief }: SheetInput): readonly Isolation[] {
  return [{ kind: "resistor", resistance: brief.charger?.resistance ?? null, words: null }];
}

function fuseOf({ fuse, layout }: SheetInput): SchematicProps["fuse"] {
  if (fuse === null || fuse.chosen === null || fuse.count === 0) return null;
  return { at: fuse.count === layout.units ? "unit" : "string", words: fuse.chosen.row.fuse };
}

export function schematicOf(input: SheetInput): SchematicProps {
  const { layout, unit, brief, words } = input;
  const { series, parallel, ties, balance } = layout;
  const { voltage, dump } = factsOf(input);
  return {
    id: "drawing-schematic",
    title: brief.title ?? layout.id,
    series,
    parallel,
    ties,
    unit: { part: unit.part, capacitance: unit.capacitance, voltage: unit.voltage, polarised: unit.polarised ?? null },
    chargeVoltage: voltage,
    charger: words.charger,
    isolation: isolationOf(input),
    balance:
      balance === null
        ? null
        : { resistance: balance.resistance, tolerance: balance.tolerance, elements: balance.elements },
    bleeds: balance === null ? [{ resistance: null, words: null }] : [],
    dump: { resistance: dump, words: null },
    switch: { kind: brief.switch?.oneWay ? "thyristor" : "unknown", words: words.switch },
    load: loadOf(input),
    clamps: {
      bank: brief.clamp !== undefined,
      positions: clampOf({ result: layout, unit, brief, share: layout.share }) !== null,
    },
    fuse: fuseOf(input),
    isolating: brief.isolating === undefined ? null : { resistance: brief.isolating, words: null },
    earth: input.earth,
  };
}

export function schematicSection(input: SheetInput): Section {
  const { layout, earth } = input;
  const props = schematicOf(input);
  const bars = barsOf(layout);
  const { balance } = props;
  const words = [
    `Charger${props.isolation.map((one) => `, isolation ${one.kind} ${said(cell(one.resistance, "resistance"), "to be chosen")}`).join("")}, bank of ${layout.series} in series by ${layout.parallel} in parallel, ${layout.ties}, between ${bars[0]} (negative end) and ${bars[bars.length - 1]} (positive end)`,
    balance === null
      ? "no balancing resistors, a bleed resistor to be chosen"
      : `a balancing resistor of ${cell(balance.resistance, "resistance")} across each ${positionWord(layout)}`,
    `dump resistor ${said(cell(props.dump?.resistance, "resistance"), "to be chosen")} with its relay`,
    `switch ${props.switch.words ?? "to be chosen"}`,
    `load ${props.load.words ?? "to be chosen"}`,
    props.clamps.positions ? `a clamp diode across each ${positionWord(layout)}` : "no clamp diodes across positions",
    earth === "none"
      ? "no end is earthed"
      : earth === "unknown"
        ? "the earth point is to be decided"
        : `the ${earth} end is at the one earth point`,
  ];
  return {
    id: "schematic",
    title: "Schematic",
    ownPage: true,
    blocks: [
      text("Symbols after IEC 60617, drawn from memory. The earth point is one, and the only one."),
      { kind: "drawing", drawn: { kind: "schematic", props }, words: `${words.join("; ")}.` },
    ],
  };
}

export function faceSection(input: SheetInput): Section {
  const { layout, unit, brief, placed, earth } = input;
  const { voltage } = factsOf(input);
  const spares =
    placed === null ? Array.from({ length: brief.spares }, () => null) : placed.spares.slice(0, sparesShown(input));
  const word = groupWord(layout);
  return {
    id: "face",
    title: "Bank face",
    ownPage: true,
    blocks: [
      text(
        `Every position with its number, serial, polarity and highest potential to earth; sticks go to every bar${layout.ties === "strings" ? " and every node inside a string" : ""}. ${placed === null ? "The units were not measured: serials are lines to fill in." : "Serials are those of the placing."}`,
      ),
      {
        kind: "drawing",
        drawn: {
          kind: "face",
          props: {
            id: "drawing-face",
            title: "Bank face",
            series: layout.series,
            parallel: layout.parallel,
            ties: layout.ties,
            groups: placed?.groups ?? null,
            spares,
            polarised: unit.polarised ?? null,
            chargeVoltage: voltage,
            earth,
            piece: FACE_PIECE,
          },
        },
        words: `${layout.units} units in ${layout.ties === "cross-tied" ? `${layout.series} stages of ${layout.parallel}` : `${layout.parallel} strings of ${layout.series}`}, numbered C1.1 to C${word === "stage" ? layout.series : layout.parallel}.${word === "stage" ? layout.parallel : layout.series}; the serial of each stands in the list of units in their places.`,
      },
    ],
  };
}
