import { describe, expect, test } from "vitest";
import { FACE_PIECE, facePieces, positionName, serialAt, sparePieces } from "../../../src/sheet/draw/facePlan.ts";
import { faceOf, serialsOf } from "../../support/faces.ts";
import fc from "../../support/property.ts";

describe("facePieces(props)", () => {
  test("a bank that fits is one piece; the positive end comes first", () => {
    expect(facePieces(faceOf())).toEqual([{ rows: [1, 4], columns: [1, 3] }]);
    expect(facePieces(faceOf({ series: 20, parallel: 9 })).map(({ rows }) => rows)).toEqual([
      [11, 20],
      [11, 20],
      [1, 10],
      [1, 10],
    ]);
  });

  test("every position is on one piece, none larger than asked or than the paper", () => {
    const size = fc.integer({ min: 1, max: 60 });
    fc.assert(
      fc.property(size, size, fc.integer({ min: 0, max: 30 }), (series, parallel, most) => {
        const pieces = facePieces({ series, parallel, piece: { columns: most, rows: most } });
        let cells = 0;
        for (const { rows, columns } of pieces) {
          const [down, across] = [rows[1] - rows[0] + 1, columns[1] - columns[0] + 1];
          expect(down).toBeLessThanOrEqual(Math.max(1, Math.min(most, FACE_PIECE.rows)));
          expect(across).toBeLessThanOrEqual(Math.max(1, Math.min(most, FACE_PIECE.columns)));
          cells += down * across;
        }
        expect(cells).toBe(series * parallel);
      }),
    );
  });
});

test("serialAt(props, place), positionName(props, place): groups are stages or strings; what is missing is null", () => {
  const groups = [["A", "B"], ["C", " "], [null]];
  const tied = faceOf({ groups });
  const strings = faceOf({ groups, ties: "strings" });
  expect(serialAt(tied, { row: 2, column: 1 })).toBe("C");
  expect(serialAt(strings, { row: 2, column: 1 })).toBe("B");
  expect(serialAt(tied, { row: 2, column: 2 })).toBeNull();
  expect(serialAt(tied, { row: 3, column: 1 })).toBeNull();
  expect(serialAt(tied, { row: 9, column: 9 })).toBeNull();
  expect(serialAt(faceOf(), { row: 1, column: 1 })).toBeNull();
  expect(positionName(tied, { row: 2, column: 1 })).toBe("2.1");
  expect(positionName(strings, { row: 2, column: 1 })).toBe("1.2");
});

test("sparePieces(props): none for none, all of them in order", () => {
  expect(sparePieces(faceOf())).toEqual([]);
  const spares = serialsOf(1, 200)[0]!;
  const pieces = sparePieces(faceOf({ spares }));
  expect(pieces.flat()).toEqual(spares);
  expect(Math.max(...pieces.map((piece) => piece.length))).toBeLessThanOrEqual(FACE_PIECE.columns * FACE_PIECE.rows);
});
