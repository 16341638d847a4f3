/** @jsxImportSource preact */
// What every page has: its head with its own style and nothing else, and the words that stand on every printed page.

import { type Paper, styleOf } from "./style.ts";

export interface PageHeadProps {
  readonly title: string;
  readonly paper: Paper;
  /** Narrow margins above and below, for full sheets of labels. */
  readonly narrow?: boolean;
}

export const PageHead = ({ title, paper, narrow = false }: PageHeadProps) => (
  <head>
    <meta charSet="utf-8" />
    <meta name="viewport" content="width=device-width, initial-scale=1" />
    <title>{title}</title>
    <style>{styleOf(paper, narrow)}</style>
  </head>
);

export const Foot = ({ layout, words }: { readonly layout: string; readonly words: readonly string[] }) => (
  <footer class="foot">
    <p>
      {layout}. {words.join(" ")}
    </p>
  </footer>
);
