// The course of one bank at its worst corner, charge to rest, with the unit limit and the safe voltage across it.
import type { BankCourse, Brief, LayoutResult } from "../../search/index.ts";
import { chartRows } from "../chart.ts";
import type { Point } from "../plot.ts";
import type { RestDetail } from "../ports.ts";
import type { Row } from "../row.ts";
import type { State } from "../state.ts";
import { shown, shownLimit, shownWorst } from "../values.ts";
import type { Room } from "./page.ts";
import { unknownWords } from "./sharingCorners.ts";
import { paragraph } from "./words.ts";

export interface DrawnIn {
  readonly brief: Brief;
  readonly state: State;
  /** Of a chart. */
  readonly size: Room;
}

/** Every phase that takes time has the same width, whatever it takes: a dump of milliseconds is seen beside an hour of holding. */
function placesOf(course: BankCourse): (phase: string, seconds: number) => number {
  const places = new Map<string, { readonly at: number; readonly from: number; readonly seconds: number }>();
  let at = 0;
  let from = 0;
  for (const { name, seconds } of course.phases) {
    places.set(name, { at, from, seconds });
    if (seconds > 0) at += 1;
    from += seconds;
  }
  return (phase, seconds) => {
    const place = places.get(phase);
    if (place === undefined) return 0;
    return place.at + (place.seconds > 0 ? Math.min(1, Math.max(0, (seconds - place.from) / place.seconds)) : 0);
  };
}

/** Points evenly apart along straight lines: dots that make a second curve. */
export function dotted(points: readonly Point[], count: number): readonly Point[] {
  const [first, last] = [points[0], points.at(-1)];
  if (first === undefined || last === undefined) return [];
  let piece = 0;
  return Array.from({ length: count }, (_, index) => {
    const x = first.x + ((last.x - first.x) * index) / Math.max(1, count - 1);
    while (piece < points.length - 2 && (points[piece + 1] as Point).x < x) piece += 1;
    const [a, b] = [points[piece] as Point, (points[piece + 1] ?? points[piece]) as Point];
    return { x, y: b.x > a.x ? a.y + ((b.y - a.y) * (x - a.x)) / (b.x - a.x) : b.y };
  });
}

function factWords(course: BankCourse, ascii: boolean): readonly string[] {
  const { stages, peak, lowest, corner, dumpResistance, endlessHold } = course;
  const name = (kind: number): string => stages[kind]?.words ?? "";
  const others = stages.slice(1).map(({ words, count }) => (count === 1 ? words : `${words} (${count})`));
  return [
    `${ascii ? "*" : "Line"}: ${name(0)}. ${ascii ? "o" : "Dots"}: ${others.join("; ")}. Corner: ${corner}.`,
    `P highest: ${shownWorst(peak.voltage, "voltage")} on ${name(peak.kind)}, in ${peak.phase}, after ${shown(peak.seconds, "time")}.`,
    ...(lowest.voltage < 0
      ? [
          `N lowest: ${shown(lowest.voltage, "voltage")}, reversed, on ${name(lowest.kind)}, in ${lowest.phase}, with no clamp fitted.`,
        ]
      : []),
    ...(endlessHold ? ["The hold is for ever: it is shown until it has settled."] : []),
    dumpResistance === null
      ? "No dump resistance was stated: the dump is taken as instant."
      : `Dump through ${shown(dumpResistance, "resistance")}.`,
  ];
}

export function courseRows(layout: LayoutResult, rest: RestDetail, { brief, state, size }: DrawnIn): readonly Row[] {
  const { course } = rest;
  const { columns } = size;
  if (course === null) {
    const why = layout.series === 1 ? "One in series: nothing is shared, so there is no course." : unknownWords(rest);
    return paragraph(why, columns, layout.series === 1 ? "plain" : "accent");
  }
  const place = placesOf(course);
  const curve = (kind: number): readonly Point[] =>
    course.instants.map(({ phase, seconds, volts }) => ({ x: place(phase, seconds), y: volts[kind] ?? Number.NaN }));
  const seconds = (name: string): number => course.phases.find((phase) => phase.name === name)?.seconds ?? 0;
  const wide = course.phases.filter((phase) => phase.seconds > 0).length;
  const high = Math.max(layout.share.limit, course.peak.voltage, rest.rating) * 1.02;
  const low = Math.min(0, course.lowest.voltage * 1.15);
  const { limit } = layout.share;
  const { touchSafe } = brief;
  const levels = [
    { y: limit, words: `limit ${shownLimit(limit, "voltage")}` },
    ...(touchSafe < limit ? [{ y: touchSafe, words: `safe ${shownLimit(touchSafe, "voltage")}` }] : []),
    ...(low < -touchSafe ? [{ y: -touchSafe, words: `safe ${shown(-touchSafe, "voltage")}` }] : []),
  ];
  const mark = ({ voltage, phase, seconds: at }: BankCourse["peak"]): Point => ({ x: place(phase, at), y: voltage });
  const dump = seconds("dump");
  return [
    ...chartRows({
      ...size,
      x: { low: 0, high: Math.max(1, wide) },
      y: { low, high },
      curves: [
        { points: curve(0), joined: true, glyph: "*" },
        ...course.stages
          .slice(1)
          .map((_, index) => ({ points: dotted(curve(index + 1), columns), joined: false, glyph: "o" })),
      ],
      levels,
      marks: [
        ...(course.lowest.voltage < 0 ? [{ at: mark(course.lowest), letter: "N" }] : []),
        { at: mark(course.peak), letter: "P" },
      ],
      top: shown(high, "voltage"),
      bottom: shown(low, "voltage"),
      under: [
        `charged, hold ${shown(seconds("hold"), "time")}`,
        dump > 0 ? `dump ${shown(dump, "time")}` : "dump, instant",
        `rest ${shown(seconds("rest"), "time")}`,
      ],
      ascii: state.look.ascii,
    }),
    ...factWords(course, state.look.ascii).flatMap((text) => paragraph(text, columns)),
  ];
}
