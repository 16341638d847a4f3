/** @jsxImportSource preact */
// A drawing of the sheet as its figures: one picture, or the pieces that fit a page each.

import {
  bleedFigures,
  costFigures,
  type Figure,
  faceFigures,
  schematicFigures,
  shotFigures,
  voltageFigures,
} from "../draw/index.ts";
import type { Drawn as DrawnData } from "../model.ts";
import { each } from "./each.ts";

function figuresOf(drawn: DrawnData): readonly Figure[] {
  switch (drawn.kind) {
    case "schematic":
      return schematicFigures(drawn.props);
    case "face":
      return faceFigures(drawn.props);
    case "voltages":
      return voltageFigures(drawn.props);
    case "bleed":
      return bleedFigures(drawn.props);
    case "shot":
      return shotFigures(drawn.props);
    case "cost":
      return costFigures(drawn.props);
  }
}

export function Drawn({ drawn }: { readonly drawn: DrawnData }) {
  return (
    <>
      {each(figuresOf(drawn), ({ drawing, caption }) => (
        <figure>
          {drawing}
          <figcaption>{caption}</figcaption>
        </figure>
      ))}
    </>
  );
}
