// The paper: build sheet, drawings, labels.
export type { Earth } from "./draw/schematicProps.ts";
export { SHEET_FORMATS, type SheetFormat, sheetText } from "./formats.ts";
export { governedOf } from "./governed.ts";
export { labelsToHtml } from "./html/labelsPage.tsx";
export { PAPERS, type Paper } from "./html/style.ts";
export type { Alternatives, AskedLine, FindingLine, PlacedUnits, SheetInput, SheetWords } from "./input.ts";
export { type Labels, labelsOf } from "./labelsOf.ts";
export type { Block, Cell, Column, Drawing, Section, Sheet, Table } from "./model.ts";
export { sheetOf } from "./sheetOf.ts";
