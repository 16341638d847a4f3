/** @jsxImportSource preact */
// The blocks of a section as elements: paragraphs, lists, tables with blanks to write in, drawings.

import type { Block, Cell, Column, Table } from "../model.ts";
import { Drawn } from "./drawn.tsx";
import { each } from "./each.ts";

const classOf = ({ side, written }: Column): string | undefined => side ?? (written ? "written" : undefined);

/** Longest word that a column is kept wide enough for; longer ones may be broken anywhere. */
const LONGEST_WORD = 16;
/** Longest figure that is kept on one line with its unit. */
const LONGEST_FIGURE = 12;

function looksOf(value: string, { side }: Column): string | undefined {
  if (value.split(/[\s-]/).some((word) => word.length > LONGEST_WORD))
    return side === undefined ? "long" : "long right";
  if (side === undefined) return undefined;
  return value.length <= LONGEST_FIGURE ? "figure" : "right";
}

/** The first cell names the row, where it says anything. */
function TableCell({
  value,
  column,
  first,
}: {
  readonly value: Cell;
  readonly column: Column;
  readonly first: boolean;
}) {
  if (value === null) return <td />;
  if (value === "") return <td class="none" />;
  const looks = looksOf(value, column);
  if (first)
    return (
      <th scope="row" class={looks}>
        {value}
      </th>
    );
  return <td class={looks}>{value}</td>;
}

function TableBlock({ table }: { readonly table: Table }) {
  const { id, caption, columns, rows } = table;
  return (
    <table id={`t-${id}`}>
      <caption>{caption}</caption>
      <thead>
        <tr>
          {each(columns, (column) => (
            <th scope="col" class={classOf(column)}>
              {column.heading}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {each(rows, (cells) => (
          <tr>
            {each(cells, (value, i) => (
              <TableCell value={value} column={columns[i] as Column} first={i === 0} />
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

export function BlockView({ block }: { readonly block: Block }) {
  switch (block.kind) {
    case "text":
      return <p>{block.text}</p>;
    case "list":
      return (
        <ul>
          {each(block.items, (item) => (
            <li>{item}</li>
          ))}
        </ul>
      );
    case "table":
      return <TableBlock table={block} />;
    case "drawing":
      return <Drawn drawn={block.drawn} />;
  }
}
