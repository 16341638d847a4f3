/** @jsxImportSource preact */
// The schematic: the whole circuit in one drawing, and the bank unit by unit where that one had to fold it.

import { shapeOf } from "../../bank/index.ts";
import { bankPieces } from "./bankPieces.ts";
import { Drawing, type Figure, PAGE } from "./drawing.tsx";
import { Inked } from "./inked.tsx";
import { legendLines } from "./legend.ts";
import { linesInk } from "./lines.ts";
import { isWhole, type MainCircuit, mainCircuit } from "./mainCircuit.ts";
import { potentialOf } from "./potential.ts";
import type { SchematicProps } from "./schematicProps.ts";
import { foldWords } from "./slots.ts";
import type { NodeWords } from "./tiedBlock.ts";
import { shownOrBlank } from "./valueWords.ts";

/** Above so many units a bank is drawn folded only. */
export const MOST_UNITS = 800;

const nodeWordsOf =
  (props: SchematicProps): NodeWords =>
  (node) => {
    const volts = potentialOf(props, node);
    return { name: `TP${node}`, potential: volts === null ? null : shownOrBlank(volts, "voltage") };
  };

function foldLines({ columns, rows }: MainCircuit, tied: boolean, pieces: number): readonly string[] {
  const folds = [
    foldWords(rows, tied ? "stages" : "places"),
    foldWords(columns, tied ? "units of each stage, places" : "strings"),
  ].filter((words) => words !== null);
  if (folds.length === 0) return [];
  const rest = pieces > 0 ? "The bank follows unit by unit." : "The bank is too large to be drawn unit by unit.";
  return [`Folded: ${folds.join("; ")}. ${rest}`];
}

/** The drawings, the whole circuit first. */
export function schematicFigures(props: SchematicProps): readonly Figure[] {
  const { id, title, series, parallel, ties } = props;
  const nodeWords = nodeWordsOf(props);
  const main = mainCircuit(props, PAGE.width, nodeWords);
  const pieces = isWhole(main) || series * parallel > MOST_UNITS ? [] : bankPieces(props, nodeWords);
  const lines = [...foldLines(main, ties === "cross-tied", pieces.length), ...legendLines(props)];
  const { ink, bottom } = linesInk(lines, main.height);
  const bank = `${shapeOf(props)} ${ties}`;
  return [
    {
      id,
      caption: `Schematic: ${title}, ${bank}`,
      drawing: (
        <Drawing
          id={id}
          title={`Schematic of ${title}`}
          description={`Circuit from charger to load with a bank of ${bank}. ${lines.join(" ")}`}
          height={bottom}
        >
          <Inked inks={[...main.inks, ink]} />
        </Drawing>
      ),
    },
    ...pieces.map(({ inks, height, words }, index): Figure => {
      const place = pieces.length === 1 ? "" : `, ${index + 1} of ${pieces.length}`;
      return {
        id: `${id}-bank-${index + 1}`,
        caption: `Bank unit by unit${place}: ${words}; the positive end is at the top`,
        drawing: (
          <Drawing
            id={`${id}-bank-${index + 1}`}
            title={`Bank of ${title} unit by unit${place}`}
            description={`Every unit and balancing resistor of ${words}. The positive end is at the top.`}
            height={height}
          >
            <Inked inks={inks} />
          </Drawing>
        ),
      };
    }),
  ];
}
