/** @jsxImportSource preact */
// The labels as one HTML page to print and cut: full sheets of them, and the cautions on every page.

import { labelFigures } from "../draw/index.ts";
import type { Labels } from "../labelsOf.ts";
import { rendered } from "../render.ts";
import { each } from "./each.ts";
import { Foot, PageHead } from "./frame.tsx";
import type { Paper } from "./style.ts";

function LabelsPage({ of, paper }: { readonly of: Labels; readonly paper: Paper }) {
  const { title, layout, labels, footer } = of;
  return (
    <html lang="en">
      <PageHead title={`Labels: ${layout}`} paper={paper} narrow />
      <body>
        <div class="pages">
          <main>
            <h1 class="screen">Labels: {title}</h1>
            {each(labelFigures({ id: "labels", title, labels, paper }), ({ drawing, caption }) => (
              <figure class="sheetful">
                {drawing}
                <figcaption>{caption}</figcaption>
              </figure>
            ))}
          </main>
          <Foot layout={layout} words={footer} />
        </div>
      </body>
    </html>
  );
}

/** The labels as HTML text, ending in a line break. */
export const labelsToHtml = (of: Labels, paper: Paper): string =>
  `<!DOCTYPE html>\n${rendered(<LabelsPage of={of} paper={paper} />)}\n`;
