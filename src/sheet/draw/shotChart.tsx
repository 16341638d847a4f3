/** @jsxImportSource preact */
// Current and voltage of a shot over the same time, one panel each, with the peak current and the deepest reversal marked.

import { formatQuantity } from "../../quantity/index.ts";
import { Drawing, type Figure } from "./drawing.tsx";
import { Inked } from "./inked.tsx";
import { linesInk } from "./lines.ts";
import { timeScale } from "./scales.ts";
import { HEIGHT, LEFT, panelInk, RIGHT } from "./shotPanel.ts";

export interface ShotSample {
  /** s, A, V */
  readonly time: number;
  readonly current: number;
  readonly voltage: number;
}

export interface ShotChartProps {
  /** Starts every id inside the drawing: letters, digits, hyphens. */
  readonly id: string;
  readonly title: string;
  readonly samples: readonly ShotSample[];
  /** The greatest current; null: not known. */
  readonly peak: { readonly time: number; readonly current: number } | null;
  /** Where the voltage is lowest, when it goes below zero; null: it does not. */
  readonly reversal: { readonly time: number; readonly voltage: number } | null;
}

const PANELS = [{ top: 22 }, { top: 206 }] as const;

const finite = ({ time, current, voltage }: ShotSample): boolean =>
  [time, current, voltage].every((value) => Number.isFinite(value));

/** The chart as one figure; none when there are not two samples to join. */
export function shotFigures({ id, title, samples, peak, reversal }: ShotChartProps): readonly Figure[] {
  const shown = samples.filter(finite);
  if (shown.length < 2) return [];
  const time = timeScale(Math.max(...shown.map((one) => one.time), 1e-12), LEFT, RIGHT);
  const start = shown[0]!.voltage;
  const when = (seconds: number): string => formatQuantity(seconds, "time", { digits: 3 });
  const peakWords =
    peak === null ? null : `peak ${formatQuantity(peak.current, "current", { digits: 3 })} at ${when(peak.time)}`;
  const share =
    reversal !== null && start > 0
      ? `, ${formatQuantity(-reversal.voltage / start, "fraction", { digits: 3 })} of the start`
      : "";
  const reversalWords =
    reversal === null
      ? null
      : `reversed to ${formatQuantity(reversal.voltage, "voltage", { digits: 3 })} at ${when(reversal.time)}${share}`;
  const sentences = [
    peakWords === null ? "Peak current: not known." : `Current: ${peakWords}.`,
    reversalWords === null ? "Voltage: not reversed." : `Voltage: ${reversalWords}.`,
  ];
  const { ink, bottom } = linesInk(sentences, PANELS[1].top + HEIGHT + 26);
  return [
    {
      id,
      caption: `Discharge: ${title}`,
      drawing: (
        <Drawing
          id={id}
          title={`Discharge of ${title}`}
          description={`Current and voltage of the bank over time. ${sentences.join(" ")}`}
          height={bottom}
        >
          <Inked
            inks={[
              ...panelInk({
                top: PANELS[0].top,
                time,
                dimension: "current",
                title: "Current of the bank",
                points: shown.map((one) => ({ time: one.time, value: one.current })),
                mark:
                  peak === null || peakWords === null
                    ? null
                    : { time: peak.time, value: peak.current, words: peakWords },
                under: peak !== null && peak.current < 0,
              }),
              ...panelInk({
                top: PANELS[1].top,
                time,
                dimension: "voltage",
                title: "Voltage of the bank",
                points: shown.map((one) => ({ time: one.time, value: one.voltage })),
                mark:
                  reversal === null || reversalWords === null
                    ? null
                    : { time: reversal.time, value: reversal.voltage, words: reversalWords },
                under: true,
              }),
              ink,
            ]}
          />
        </Drawing>
      ),
    },
  ];
}
