/** @jsxImportSource preact */
// Pages of labels to print and cut: units, stages, strings and spares, in a grid that fits the paper.

import { Drawing, type Figure } from "./drawing.tsx";
import { Inked } from "./inked.tsx";
import { LABEL_GRID, LABEL_SIZE, type Label, type LabelPaper, labelPages } from "./label.ts";
import { labelInk, labelTitle } from "./labelInk.ts";
import { counted } from "./valueWords.ts";

export interface LabelsProps {
  /** Starts every id inside the drawing: letters, digits, hyphens. */
  readonly id: string;
  readonly title: string;
  readonly labels: readonly Label[];
  readonly paper: LabelPaper;
}

/** One figure to a page; none without labels. */
export function labelFigures({ id, title, labels, paper }: LabelsProps): readonly Figure[] {
  const { columns } = LABEL_GRID[paper];
  const pages = labelPages(labels, paper);
  return pages.map((page, index): Figure => {
    const inks = page.map((label, place) =>
      labelInk(label, {
        x: (place % columns) * LABEL_SIZE.width,
        y: Math.floor(place / columns) * LABEL_SIZE.height + 0.5,
      }),
    );
    const names = page.length === 1 ? labelTitle(page[0]!) : `${labelTitle(page[0]!)} to ${labelTitle(page.at(-1)!)}`;
    return {
      id: `${id}-${index + 1}`,
      caption: `Labels for ${paper}, ${index + 1} of ${pages.length}: ${counted(page.length, "label")}, ${names}`,
      drawing: (
        <Drawing
          id={`${id}-${index + 1}`}
          title={`Labels of ${title}`}
          description={`${counted(page.length, "label")}: ${page.map(labelTitle).join(", ")}.`}
          height={Math.ceil(page.length / columns) * LABEL_SIZE.height + 1}
        >
          <Inked inks={inks} />
        </Drawing>
      ),
    };
  });
}
