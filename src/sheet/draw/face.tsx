/** @jsxImportSource preact */
// The bank face: every position with its number, serial, polarity and potential, in pieces that fit a page, the spares aside.

import { shapeOf } from "../../bank/index.ts";
import { Drawing, type Figure } from "./drawing.tsx";
import { type FaceDrawn, faceInk, spareInk } from "./faceInk.ts";
import { FACE_PIECE, type FaceProps, facePieces, sparePieces } from "./facePlan.ts";
import { Inked } from "./inked.tsx";
import { linesInk } from "./lines.ts";
import { counted } from "./valueWords.ts";

const EARTHS = {
  negative:
    "Potentials: to earth, of the terminal further from it, at full charge shared evenly; the negative end is earthed.",
  positive:
    "Potentials: to earth, of the terminal further from it, at full charge shared evenly; the positive end is earthed.",
  none: "No end is earthed: treat every terminal as live to earth at full voltage.",
  unknown: "Earthed end: ________. Potentials are to be filled in when it is decided.",
} as const;

function faceLines({ ties, series, polarised, earth, chargeVoltage }: FaceProps): readonly string[] {
  const numbers = ties === "cross-tied" ? "stage, then place in it" : "string, then place in it";
  const polarity = polarised === null ? " Polarity not known: mark it by hand." : "";
  const volts = chargeVoltage === null && earth !== "none" ? " Charge voltage not known: fill in." : "";
  return [
    `Numbers: ${numbers}; the positive end is at the top, 1 is at the negative end. Electrical order.${polarity}`,
    `${EARTHS[earth]}${volts}`,
    `Dot in a ring: apply the earthing stick, each in turn, then measure.${ties === "strings" && series > 1 ? " TP1.1 is above unit 1.1." : ""} A serial with … is whole in the unit table.`,
  ];
}

/** The pieces of the face, then those of the spares. */
export function faceFigures(props: FaceProps): readonly Figure[] {
  const { id, title, spares } = props;
  const tied = props.ties === "cross-tied";
  const pieces = facePieces(props);
  const aside = sparePieces(props);
  const figure = (part: string, caption: string, drawn: FaceDrawn, lines: readonly string[]): Figure => {
    const { ink, bottom } = linesInk(lines, drawn.height);
    return {
      id: `${id}-${part}`,
      caption,
      drawing: (
        <Drawing
          id={`${id}-${part}`}
          title={`Bank face of ${title}`}
          description={`${caption}. ${lines.join(" ")}`}
          height={bottom}
        >
          <Inked inks={[...drawn.inks, ink]} />
        </Drawing>
      ),
    };
  };
  const span = (thing: string, [from, to]: readonly [number, number]): string =>
    from === to ? `${thing} ${from}` : `${thing}s ${from} to ${to}`;
  let first = 1;
  return [
    ...pieces.map((piece, index) => {
      const place = pieces.length === 1 ? "" : `, ${index + 1} of ${pieces.length}`;
      const where = `${span(tied ? "stage" : "place", piece.rows)}, ${span(tied ? "place" : "string", piece.columns)}`;
      const caption = `Bank face ${shapeOf(props)} ${props.ties}${place}: ${where}`;
      return figure(`${index + 1}`, caption, faceInk(props, piece), faceLines(props));
    }),
    ...aside.map((serials, index) => {
      const drawn = spareInk(serials, first, Math.min(props.piece.columns, FACE_PIECE.columns));
      first += serials.length;
      const caption = `Spares, not connected: ${counted(serials.length, "unit")} of ${spares.length}`;
      return figure(`spares-${index + 1}`, caption, drawn, [
        "Spares are kept with their terminals shorted: initial each when its link is on.",
      ]);
    }),
  ];
}
