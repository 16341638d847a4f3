import { describe, expect, test } from "vitest";
import { purchase } from "../../src/catalog/index.ts";
import { bleedChart, costChart, shotChart, voltageChart } from "../../src/sheet/charts.ts";
import { BARE, placedIn, RATED, sheetInput } from "../support/sheet.ts";

const props = <K extends string>(drawing: { readonly drawn: { readonly kind: K } } | null, kind: K) => {
  if (drawing === null || drawing.drawn.kind !== kind) throw new Error(`no ${kind}`);
  return (drawing.drawn as unknown as { readonly props: never }).props as never as Record<string, never>;
};

describe("voltageChart(input)", () => {
  test("each state with its worst; limit, rating and surge across; unknown stays unknown", () => {
    const input = sheetInput({ unit: { ...RATED, surgeVoltage: 440 } });
    const chart = voltageChart(input);
    expect(props(chart, "voltages")).toMatchObject({
      bars: [
        { words: "charging", nominal: 250, worst: input.layout.share.charging },
        { words: "holding", worst: input.layout.share.holding },
        { words: "one unit shorted" },
      ],
      limits: [{ value: 360 }, { value: 400 }, { value: 440 }],
    });
    expect(chart.words).toMatch(/Limits: limit, derating in it 360 V; rated 400 V; surge 440 V/);
    expect(props(voltageChart(sheetInput({ unit: BARE })), "voltages")).toMatchObject({
      bars: [{ worst: null }, { worst: null }, {}],
    });
  });

  test("measured units have their own worst", () => {
    const bare = sheetInput();
    const placed = placedIn(bare);
    const worst = Math.max(...placed.positions.map((p) => p.share ?? 0)) * 2000;
    expect(props(voltageChart({ ...bare, placed }), "voltages")).toMatchObject({
      bars: [{}, {}, { words: "charging, as measured and placed", nominal: 250, worst }, {}],
    });
  });
});

describe("bleedChart(input)", () => {
  test("straight lines on the log scale: at its end each curve stands where its own time constant says", () => {
    const input = sheetInput({ brief: { dumpResistance: "1 kohm" }, shape: { ties: "strings", parallel: 3 } });
    const { curves, thresholds } = props(bleedChart(input), "bleed") as unknown as {
      readonly curves: readonly {
        readonly words: string;
        readonly points: readonly { readonly time: number; readonly voltage: number }[];
      }[];
      readonly thresholds: readonly { readonly value: number }[];
    };
    expect(curves.map(({ words }) => words)).toEqual(["bleed chains", "one bleeder open", "dump resistor"]);
    const c = (1.2e-3 / 8) * 3;
    const r = input.layout.balance!.resistance * 1.05 * 8;
    for (const [curve, resistance] of [
      [curves[0]!, r / 3],
      [curves[1]!, r / 2],
      [curves[2]!, 1000],
    ] as const) {
      const end = curve.points[1]!;
      expect(end.voltage / (2000 * Math.exp(-end.time / (resistance * c)))).toBeCloseTo(1, 9);
      expect(end.voltage).toBeLessThan(60);
    }
    expect(thresholds).toEqual([expect.objectContaining({ value: 60 })]);
  });

  test("nothing to draw without a tolerance, or without any way down", () => {
    expect(bleedChart(sheetInput({ unit: BARE }))).toBeNull();
    expect(
      bleedChart(sheetInput({ shape: { series: 1, ties: "strings" }, brief: { voltage: "300 V", energy: "10 J" } })),
    ).toBeNull();
    expect(bleedChart(sheetInput())?.words).toMatch(/with one bleeder open never, so that curve is not drawn/);
  });
});

describe("shotChart(input)", () => {
  test("the peak is among the samples, the reversal where the voltage is lowest", () => {
    const ringing = sheetInput({ brief: { load: { resistance: "10 mohm", inductance: "25 uH" } } });
    const { samples, peak, reversal } = props(shotChart(ringing), "shot") as unknown as {
      readonly samples: readonly { readonly time: number; readonly current: number; readonly voltage: number }[];
      readonly peak: { readonly time: number; readonly current: number };
      readonly reversal: { readonly voltage: number } | null;
    };
    expect(Math.max(...samples.map(({ current }) => current))).toBeCloseTo(peak.current, 6);
    expect(samples.some(({ time }) => time === peak.time)).toBe(true);
    expect(reversal!.voltage).toBe(Math.min(...samples.map(({ voltage }) => voltage)));
    expect(-reversal!.voltage / 2000).toBeLessThanOrEqual(ringing.shot!.discharge.reversal + 1e-9);
    expect(shotChart(sheetInput())).toBeNull();
    expect(
      props(shotChart(sheetInput({ brief: { load: { resistance: "20 ohm", inductance: "1 uH" } } })), "shot"),
    ).toMatchObject({ reversal: null });
  });
});

describe("costChart(input)", () => {
  test("the ladder of the unit's own terms, the need with its spares among its steps", () => {
    const chart = costChart(sheetInput({ brief: { spares: 2 } }));
    const { steps, needed } = props(chart, "cost") as unknown as {
      readonly steps: readonly { readonly from: number; readonly to: number; readonly cost: number | null }[];
      readonly needed: number;
    };
    expect(needed).toBe(18);
    const found = purchase(RATED, 18);
    expect(steps.find(({ from, to }) => from <= 18 && to >= 18)?.cost).toBe(found?.cost);
    expect(chart?.words).toMatch(/^18 units are needed, spares in them; 20 are bought, for 50\.00 EUR\.$/);
  });

  test("no price, or not enough to be had: no chart", () => {
    expect(costChart(sheetInput({ unit: BARE }))).toBeNull();
    expect(costChart(sheetInput({ unit: { ...RATED, onHand: 0, available: 10 } }))).toBeNull();
  });
});
