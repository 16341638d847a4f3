// The conductors of the bank and what stands between them: sizes from the units, from the bus of the brief and from its shot.
//
// A bar of copper may warm by WARMING in one shot with no time to cool. Source: [common-practice] the warming; [IEC60949] the section for it.

import { clearanceAdvice } from "../hazard/index.ts";
import { leastArea } from "../pulse/index.ts";
import { formatQuantity } from "../quantity/index.ts";
import { type Brief, shotOf } from "../search/index.ts";
import type { BillLine } from "./bill.ts";
import { toBeChosen, type Wish } from "./chosenLine.ts";
import { countsOf } from "./counts.ts";
import type { OtherInput } from "./otherLines.ts";

/** K in one shot. Common practice, no source. */
export const WARMING = 20;
const CELSIUS_ZERO = 273.15;
const ROOM = 25;

const up = (value: number, dimension: "voltage" | "length"): string =>
  formatQuantity(value, dimension, { digits: 3, rounding: "up" });
const size = (value: number | undefined): string => formatQuantity(value ?? null, "length");
const fullVoltage = ({ voltage, overshoot }: Brief): number => voltage * (1 + overshoot);

/** How long a bar is that joins the units of one stage standing side by side, m; null when their size is unknown. */
function barLength({ layout, unit }: OtherInput): number | null {
  const pitch = unit.diameter ?? unit.width;
  return pitch === undefined ? null : pitch * layout.parallel;
}

/** Least section of a copper conductor that carries the whole shot, m^2; null without a load, or where its action has no bound. */
export function shotSection({ layout, unit, brief }: OtherInput): number | null {
  if (brief.load === undefined) return null;
  const shot = shotOf({ layout, unit, brief });
  const action = shot.ok ? shot.value.envelope.action.high : null;
  if (action === null) return null;
  const from = (brief.ambient ?? ROOM) + CELSIUS_ZERO;
  return leastArea("copper", action, { from, to: from + WARMING });
}

/** mm^2, rounded up to two figures. */
export const sectionWords = (section: number): string => {
  const square = section * 1e6;
  const step = Number(`1e${Math.floor(Math.log10(square)) - 1}`);
  return `at least ${Number((Math.ceil(square / step - 1e-9) * step).toPrecision(2))} mm2 of copper`;
};

function barWish(input: OtherInput, section: number | null): Wish {
  const bar = barLength(input);
  const asked = [
    ...(bar === null ? [] : [`at least ${up(bar, "length")} long`]),
    ...(section === null ? [] : [sectionWords(section)]),
  ];
  const long = bar === null ? "length unknown, because the unit's size is" : "length for units side by side in one row";
  const wide =
    section === null
      ? "Section by the shot's current."
      : `Section for ${WARMING} K in one whole shot through one bar; a dead short may pass more.`;
  return {
    item: "bus bar",
    line: "bus bars",
    needed: countsOf(input.layout).bars,
    ...(asked.length === 0 ? {} : { value: asked.join(", ") }),
    note: `One to each potential that units share; ${long}. ${wide}`,
  };
}

/** From the bank to the load: as the brief's bus says, else two conductors to be chosen. */
function loadBusWish({ brief }: OtherInput, section: number | null): Wish {
  const { bus } = brief;
  const wish = {
    item: "bus to the load",
    line: "load bus",
    rating: `at least ${up(fullVoltage(brief), "voltage")} dc`,
  } as const;
  const note = section === null ? "" : ` The shot asks ${sectionWords(section)}.`;
  if (bus?.shape === undefined) {
    const measured = bus === undefined ? "" : " The brief's bus is one that was measured.";
    const value = section === null ? {} : { value: sectionWords(section) };
    return {
      ...wish,
      ...value,
      needed: 2,
      note: `Go and return, side by side; length follows from where the load stands.${measured}`,
    };
  }
  const { metal } = bus;
  const long = `${size(bus.length)} long`;
  if (bus.shape === "flat bars") {
    const value = `${size(bus.width)} x ${size(bus.thickness)} ${metal}, ${long}`;
    return { ...wish, needed: 2, value, note: `Go and return, ${size(bus.gap)} apart, as in the brief.${note}` };
  }
  if (bus.shape === "wire pair") {
    const value = `${size(2 * (bus.radius ?? Number.NaN))} across, ${metal}, ${long}`;
    return {
      ...wish,
      needed: 2,
      value,
      note: `Go and return, ${size(bus.spacing)} between centres, as in the brief.${note}`,
    };
  }
  const value = `core ${size(2 * (bus.inner ?? Number.NaN))}, shell ${size(2 * (bus.outer ?? Number.NaN))} inside, wall ${size(bus.wall)}, ${metal}, ${long}`;
  return { ...wish, needed: 1, value, note: `Coaxial, as in the brief.${note}` };
}

/** The sheet between flat bars, wider by the advised clearance on every side; else its size is open. */
function insulatorWish({ brief }: OtherInput): Wish {
  const volts = fullVoltage(brief);
  const wish = { item: "insulator sheet", line: "insulator", rating: `at least ${up(volts, "voltage")} dc` } as const;
  const { bus } = brief;
  const advice = clearanceAdvice({ voltage: volts });
  if (bus?.shape !== "flat bars" || bus.length === undefined || bus.width === undefined || !advice.ok)
    return {
      ...wish,
      needed: null,
      note: "Between the bars and to the case; size follows from how the bank is laid out.",
    };
  const edge = 2 * advice.value.advised;
  return {
    ...wish,
    needed: 1,
    value: `at least ${up(bus.length + edge, "length")} x ${up(bus.width + edge, "length")}, at most ${size(bus.gap)} thick`,
    note: `Between the bars of the brief's bus, ${up(advice.value.advised, "length")} over every edge: advice, the standard decides. More between the bank's own bars and to the case.`,
  };
}

/** Bars between the units, the bus to the load, and the insulation between. */
export function busLines(input: OtherInput): readonly BillLine[] {
  const section = shotSection(input);
  return [barWish(input, section), loadBusWish(input, section), insulatorWish(input)].map(toBeChosen);
}
