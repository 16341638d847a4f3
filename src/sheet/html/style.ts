// How the sheet looks on paper and screen: black on white, one column, rows and headings kept whole, cautions on every page.

import { LABEL_PAPERS, type LabelPaper } from "../draw/index.ts";

export const PAPERS = LABEL_PAPERS;
export type Paper = LabelPaper;

/** Constant text of our own. It has no quote, ampersand or less-than, which escaping would change. */
export const styleOf = (paper: Paper, narrow = false): string => `
@page { size: ${paper} portrait; margin: ${narrow ? "9mm 15mm 7mm" : "14mm 15mm 10mm"}; }
:root { color-scheme: light; }
html { background: #fff; color: #000; font: 9.5pt/1.35 Liberation Sans, Arial, Helvetica, sans-serif; }
body { margin: 0 auto; max-width: 180mm; padding: 8mm; }
h1 { font-size: 17pt; margin: 0 0 3mm; }
h2 { font-size: 13pt; margin: 7mm 0 2mm; border-bottom: 1pt solid #000; }
h1, h2 { break-after: avoid; break-inside: avoid; }
p, ul, ol { margin: 0 0 2.5mm; orphans: 3; widows: 3; }
ul, ol { padding-left: 5mm; }
li { break-inside: avoid; }
nav ol { columns: 3; font-size: 8.5pt; }
a { color: inherit; }
table { width: 100%; border-collapse: collapse; margin: 0 0 4mm; font-size: 8pt; line-height: 1.25; }
caption { caption-side: top; text-align: left; font-weight: bold; padding: 1mm 0; break-after: avoid; break-inside: avoid; }
thead { display: table-header-group; break-after: avoid; }
tbody tr:first-child { break-before: avoid; }
tr { break-inside: avoid; }
th, td { border: 0.5pt solid #000; padding: 0.7mm 1.2mm; text-align: left; vertical-align: top; }
.long { overflow-wrap: anywhere; }
.figure { white-space: nowrap; }
thead th { border-bottom-width: 1.2pt; font-weight: bold; }
tbody th { font-weight: normal; }
.right, .figure { text-align: right; }
.written { min-width: 13mm; }
td:empty:not(.none) { border-style: dotted; height: 4.5mm; }
figure { margin: 0 0 4mm; break-inside: avoid; }
figure svg { display: block; width: 100%; height: auto; }
figcaption { font-size: 8pt; }
.stop { border: 1.5pt solid #000; padding: 2mm 3mm; margin: 0 0 4mm; break-inside: avoid; }
.stop p { margin: 0 0 1mm; }
.foot { border-top: 1pt solid #000; font-size: 7pt; line-height: 1.2; }
.foot p { margin: 0; padding: 1mm 0 0; }
#limits { break-inside: avoid; }
#door { font-size: 12pt; }
#door table { font-size: 13pt; }
#door h2 { font-size: 24pt; border: 3pt solid #000; padding: 3mm; text-align: center; }
@media print {
  body { max-width: none; padding: 0; }
  .screen { display: none; }
  .sheetful { margin: 0; }
  .sheetful + .sheetful { break-before: page; }
  .own { break-before: page; }
  .own > h2 { margin-top: 0; }
  .pages { display: table; width: 100%; border-collapse: collapse; }
  .pages > main { display: table-row-group; }
  .pages > footer { display: table-footer-group; break-inside: avoid; }
}
@media screen { .foot { position: sticky; bottom: 0; background: #fff; } }
`;
