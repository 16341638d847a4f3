/** @jsxImportSource preact */
// Cost against the quantity needed, as steps: packs, minimum order and price breaks as they fall, the bank's own quantity marked.

import { formatMoney } from "../../quantity/index.ts";
import { axesInk } from "./axes.ts";
import type { CostStep } from "./costSteps.ts";
import { Drawing, type Figure, SIZES } from "./drawing.tsx";
import { down, type Ink } from "./ink.ts";
import { Inked } from "./inked.tsx";
import { linesInk } from "./lines.ts";
import { linePath } from "./paths.ts";
import { linearScale, type Scale } from "./scales.ts";
import { counted } from "./valueWords.ts";

export interface CostChartProps {
  /** Starts every id inside the drawing: letters, digits, hyphens. */
  readonly id: string;
  readonly title: string;
  readonly steps: readonly CostStep[];
  /** Pieces that the bank needs. */
  readonly needed: number;
  readonly currency: string;
}

const FRAME = { left: 72, right: 486, top: 22, bottom: 192 } as const;

type Priced = CostStep & { readonly cost: number };
const isPriced = (step: CostStep): step is Priced => step.cost !== null && Number.isFinite(step.cost);

/** Treads are solid, risers dashed: only the treads can be bought. A tread of one piece keeps a visible length. */
function stepsInk(steps: readonly Priced[], pieces: Scale, money: Scale): Ink {
  const treads = steps.map(({ from, to, cost }) => {
    const y = money.place(cost);
    return linePath([
      { x: pieces.place(from - 0.5), y },
      { x: pieces.place(to + 0.5), y },
    ]);
  });
  const risers = steps.slice(1).flatMap((step, index) => {
    const before = steps[index]!;
    if (before.to + 1 !== step.from) return [];
    return [down(pieces.place(step.from - 0.5), money.place(before.cost), money.place(step.cost))];
  });
  return { curves: treads.map((d) => ({ role: "step", d, width: 1.6 })), dashes: risers };
}

/** What the bank's own quantity costs, in words. */
export function neededWords({
  steps,
  needed,
  currency,
}: Pick<CostChartProps, "steps" | "needed" | "currency">): string {
  const step = steps.find(({ from, to }) => from <= needed && needed <= to);
  if (step === undefined) return `${needed} needed: not to be had`;
  return `${needed} needed: ${step.bought} bought, ${formatMoney(step.cost, currency)}`;
}

/** The chart as one figure; none when nothing has a price or all is on hand. */
export function costFigures(props: CostChartProps): readonly Figure[] {
  const { id, title, steps, needed, currency } = props;
  const priced = steps.filter(isPriced);
  const dearest = Math.max(...priced.map(({ cost }) => cost));
  if (!(dearest > 0)) return [];
  const last = Math.max(needed, ...steps.map(({ to }) => to)) + 0.5;
  const pieces = linearScale({ low: 0, high: last, from: FRAME.left, to: FRAME.right });
  const money = linearScale({
    low: 0,
    high: dearest,
    from: FRAME.bottom,
    to: FRAME.top,
  });
  const words = neededWords(props);
  const own = priced.find(({ from, to }) => from <= needed && needed <= to);
  const spot = { x: pieces.place(needed), y: own === undefined ? FRAME.bottom : money.place(own.cost) };
  const left = steps.length > priced.length ? " Without a price: left out." : "";
  const { ink, bottom } = linesInk(
    [`${words}. What is on hand is used first and costs nothing.${left}`],
    FRAME.bottom + 26,
  );
  return [
    {
      id,
      caption: `Cost steps: ${title}`,
      drawing: (
        <Drawing
          id={id}
          title={`Cost against quantity needed: ${title}`}
          description={`${words}. ${counted(priced.length, "step")} from ${formatMoney(priced[0]!.cost, currency)} to ${formatMoney(priced.at(-1)!.cost, currency)}.`}
          height={bottom}
        >
          <Inked
            inks={[
              axesInk({
                ...FRAME,
                horizontal: {
                  scale: pieces,
                  ticks: pieces.ticks(8).filter((tick) => Number.isInteger(tick)),
                  words: (value) => `${value}`,
                  title: "Pieces needed",
                },
                vertical: {
                  scale: money,
                  ticks: money.ticks(5).filter((tick) => Number.isInteger(tick)),
                  words: (value) => formatMoney(value, currency),
                  title: "Cost of the cheapest purchase",
                },
              }),
              stepsInk(priced, pieces, money),
              {
                dashes: [down(spot.x, spot.y, FRAME.bottom)],
                points: own === undefined ? [] : [spot],
                words: [
                  {
                    x: Math.min(Math.max(spot.x, 160), 400),
                    y: FRAME.top - 6,
                    text: words,
                    anchor: "middle",
                    size: SIZES.small,
                    bold: true,
                  },
                ],
              },
              ink,
            ]}
          />
        </Drawing>
      ),
    },
  ];
}
