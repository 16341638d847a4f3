// A long run, started by hand: every kind of drawing, for banks from 1s1p to 20s40p, measured letter by letter in Chromium.
// Bundle and run: npx esbuild test/campaigns/drawings.ts --bundle --platform=node --format=esm --packages=external
//   --jsx=automatic --outfile=drawings-campaign.mjs && CHROMIUM=/path/to/chromium node drawings-campaign.mjs
// Prints one line a claim, with the first offenders, and ends with exit status 1 when one fails.
import { chromium } from "playwright-core";
import {
  bleedFigures,
  costFigures,
  costSteps,
  FACE_PIECE,
  type Figure,
  faceFigures,
  type Label,
  labelFigures,
  PAGE,
  schematicFigures,
  shotFigures,
  voltageFigures,
} from "../../src/sheet/draw/index.ts";
import { rendered } from "../../src/sheet/render.ts";
import { schematicOf } from "../support/drawn.ts";
import { faceOf, serialsOf } from "../support/faces.ts";

const SHAPES = [
  [1, 1],
  [1, 12],
  [3, 3],
  [6, 10],
  [12, 1],
  [20, 40],
] as const;
/** Wide, narrow and usual letters: what a reader's sans-serif may be. */
const FONTS = ["sans-serif", "DejaVu Sans", "Liberation Sans", "Liberation Sans Narrow"];
const part = { resistance: 1e5 / 3, words: "on the lid" };

function bankFigures(
  series: number,
  parallel: number,
  ties: "cross-tied" | "strings",
  full: boolean,
): readonly Figure[] {
  const tied = ties === "cross-tied";
  const groups = tied ? serialsOf(series, parallel) : serialsOf(parallel, series);
  const id = `${series}-${parallel}-${ties}-${full}`;
  return [
    ...schematicFigures(
      schematicOf({
        id: `s${id}`,
        series,
        parallel,
        ties,
        chargeVoltage: 12345,
        bleeds: full ? [part, part, part] : [],
        isolation: full
          ? [
              { kind: "relay", ...part },
              { kind: "diode", ...part },
              { kind: "resistor", ...part },
            ]
          : [],
        clamps: { bank: full, positions: full },
        fuse: full ? { at: tied ? "unit" : "string", words: null } : null,
        isolating: full ? part : null,
        load: { kind: "lamp", words: null, coil: full },
        earth: full ? "positive" : "negative",
      }),
    ),
    ...faceFigures(
      faceOf({
        id: `f${id}`,
        series,
        parallel,
        ties,
        groups: full ? groups : null,
        chargeVoltage: 12345,
        earth: full ? "positive" : "negative",
        spares: full ? ["LOT-2026-11-A-0042", null] : [],
        piece: FACE_PIECE,
      }),
    ),
  ];
}

const fall = (words: string, tau: number) => ({
  words,
  points: [
    { time: 0, voltage: 2200 },
    { time: 20 * tau, voltage: 2200 * Math.exp(-20) },
  ],
});
const labels: readonly Label[] = Array.from({ length: 60 }, (_, index) => ({
  kind: index % 7 === 0 ? "stage" : "unit",
  position: `${1 + (index % 20)}.${1 + (index % 40)}`,
  ...(index % 7 === 0 ? {} : { serial: index % 5 === 0 ? null : `LOT-2026-11-A-${index}` }),
  part: "DEMO 470/450",
  polarised: index % 6 === 0 ? null : true,
  voltage: 12345,
  capacitance: 470e-6,
  toEarth: index % 4 === 0 ? null : 12345,
}));
const samples = Array.from({ length: 300 }, (_, index) => {
  const time = index * 2e-6;
  const decay = Math.exp(-4e3 * time);
  return { time, current: 14e3 * decay * Math.sin(2e4 * time), voltage: 2200 * decay * Math.cos(2e4 * time) };
});

const chartFigures: readonly Figure[] = [
  ...voltageFigures({
    id: "v",
    title: "invented",
    bars: ["charging", "holding, for ever", "one unit of a stage shorted, charger on", "dumped"].map(
      (words, index) => ({
        words,
        nominal: 366.7,
        worst: index === 3 ? null : 401.2 + 30 * index,
      }),
    ),
    limits: [
      { words: "limit, 90 % of rating", value: 405 },
      { words: "rating", value: 450 },
    ],
  }),
  ...bleedFigures({
    id: "b",
    title: "invented",
    curves: [
      fall("all balancing chains", 113),
      fall("one chain open", 140),
      fall("one stage shorted", 94),
      fall("dump", 5),
    ],
    thresholds: [
      { words: "touch-safe", value: 60 },
      { words: "second threshold", value: 100 },
    ],
  }),
  ...shotFigures({
    id: "sh",
    title: "invented",
    samples,
    peak: { time: 68.7e-6, current: 10.43e3 },
    reversal: { time: 147e-6, voltage: -1197 },
  }),
  ...costFigures({
    id: "c",
    title: "DEMO",
    steps: costSteps({ price: 420, priceBreaks: [{ from: 50, price: 380 }], pack: 8, onHand: 5 }, 60),
    needed: 60,
    currency: "EUR",
  }),
  ...labelFigures({ id: "l", title: "invented", labels, paper: "A4" }),
];

const figures = [
  ...SHAPES.flatMap(([series, parallel]) =>
    (["cross-tied", "strings"] as const).flatMap((ties) =>
      [false, true].flatMap((full) => bankFigures(series, parallel, ties, full)),
    ),
  ),
  ...chartFigures,
];

const page = (font: string): string =>
  `<!DOCTYPE html><html lang="en"><meta charset="utf-8"><title>t</title><style>svg{display:block;width:${PAGE.width}px;height:auto}text{font-family:"${font}"}</style><body>${figures.map(({ drawing }) => rendered(drawing)).join("\n")}</body></html>`;

/** Runs in the page: texts out of their drawing, and texts that stand on one another. */
function measure(): {
  readonly outside: readonly string[];
  readonly covered: readonly string[];
  readonly texts: number;
} {
  const outside: string[] = [];
  const covered: string[] = [];
  let texts = 0;
  for (const svg of document.querySelectorAll("svg")) {
    const { width, height } = svg.viewBox.baseVal;
    const boxes = [...svg.querySelectorAll("text")].map((text) => ({
      said: text.textContent ?? "",
      box: text.getBBox(),
    }));
    texts += boxes.length;
    boxes.forEach(({ said, box }, index) => {
      const name = `${svg.id}: "${said}"`;
      // Of a letter's box the lowest fifth is for descenders and may be empty.
      if (box.x < -0.2 || box.y < -0.2 || box.x + box.width > width + 0.2 || box.y + box.height > height + 1)
        outside.push(`${name} at ${box.x.toFixed(1)} ${box.y.toFixed(1)}, ${box.width.toFixed(1)} wide`);
      for (const other of boxes.slice(index + 1)) {
        const across = Math.min(box.x + box.width, other.box.x + other.box.width) - Math.max(box.x, other.box.x);
        const down = Math.min(box.y + box.height, other.box.y + other.box.height) - Math.max(box.y, other.box.y);
        if (across > 0.5 && down > 2.6)
          covered.push(`${name} and "${other.said}" by ${across.toFixed(1)} x ${down.toFixed(1)}`);
      }
    });
  }
  return { outside, covered, texts };
}

const browser = await chromium.launch({
  executablePath: process.env.CHROMIUM ?? "/usr/bin/chromium",
  args: ["--no-sandbox", "--disable-gpu", "--disable-background-networking"],
});
let failed = false;
const tab = await browser.newPage();
for (const font of FONTS) {
  await tab.setContent(page(font));
  const { outside, covered, texts } = await tab.evaluate(measure);
  for (const [claim, faults] of [
    ["no text out of its drawing", outside],
    ["no text on another", covered],
  ] as const) {
    console.log(
      `${faults.length === 0 ? "holds" : "FAILS"}  ${font}: ${claim}: ${texts} texts in ${figures.length} drawings, ${faults.length} against it`,
    );
    for (const fault of faults.slice(0, 12)) console.log(`       ${fault}`);
    failed ||= faults.length > 0;
  }
}
await browser.close();
process.exit(failed ? 1 : 0);
