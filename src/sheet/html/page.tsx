/** @jsxImportSource preact */
// The whole sheet as one HTML page: head, cautions, contents, sections, and the words that stand on every printed page.

import type { Cell, Section, Sheet } from "../model.ts";
import { rendered } from "../render.ts";
import { BlockView } from "./blocks.tsx";
import { each } from "./each.ts";
import { Foot, PageHead } from "./frame.tsx";
import type { Paper } from "./style.ts";

function SectionView({ section }: { readonly section: Section }) {
  const { id, title, ownPage, blocks } = section;
  return (
    <section id={id} class={ownPage ? "own" : undefined} aria-labelledby={`h-${id}`}>
      <h2 id={`h-${id}`}>{title}</h2>
      {each(blocks, (block) => (
        <BlockView block={block} />
      ))}
    </section>
  );
}

/** A blank stays one until a hand fills it. */
const Fact = ({ name, value }: { readonly name: string; readonly value: Cell }) => (
  <tr>
    <th scope="row">{name}</th>
    {value === null ? <td /> : <td>{value}</td>}
  </tr>
);

function Head({ sheet }: { readonly sheet: Sheet }) {
  return (
    <header>
      <h1>Build sheet: {sheet.title}</h1>
      <table>
        <caption>This sheet</caption>
        <tbody>
          <Fact name="layout" value={sheet.layout} />
          <Fact name="rule that governs" value={sheet.rule} />
          <Fact name="revision" value={sheet.revision} />
          <Fact name="date" value={sheet.date} />
          <Fact name="made with" value={sheet.program} />
        </tbody>
      </table>
      <div class="stop">
        <ul>
          {each(sheet.cautions, (caution) => (
            <li>{caution}</li>
          ))}
        </ul>
      </div>
      <nav aria-label="Sections">
        <ol>
          {each(sheet.sections, ({ id, title }) => (
            <li>
              <a href={`#${id}`}>{title}</a>
            </li>
          ))}
        </ol>
      </nav>
    </header>
  );
}

function SheetPage({ sheet, paper }: { readonly sheet: Sheet; readonly paper: Paper }) {
  return (
    <html lang="en">
      <PageHead title={`Build sheet: ${sheet.layout}`} paper={paper} />
      <body>
        <div class="pages">
          <main>
            <Head sheet={sheet} />
            {each(sheet.sections, (section) => (
              <SectionView section={section} />
            ))}
          </main>
          <Foot layout={sheet.layout} words={sheet.footer} />
        </div>
      </body>
    </html>
  );
}

/** The sheet as HTML text, ending in a line break. */
export const sheetToHtml = (sheet: Sheet, paper: Paper): string =>
  `<!DOCTYPE html>\n${rendered(<SheetPage sheet={sheet} paper={paper} />)}\n`;
