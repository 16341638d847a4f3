// Bill of materials: counted lines, packs, prices, and the text of each format.
export { type Alternates, alternatesFor } from "./alternates.ts";
export {
  type Bill,
  type BillChange,
  type BillLine,
  LINE_KINDS,
  type LineKind,
  type LineState,
  type Totals,
} from "./bill.ts";
export { type BillInput, billOf } from "./billOf.ts";
export { type BlendBillInput, blendBillOf } from "./blendBill.ts";
export { sectionWords, shotSection, WARMING } from "./busLines.ts";
export { BILL_COLUMNS, type BillColumn } from "./columns.ts";
export { type Counts, countsOf } from "./counts.ts";
export { csvText } from "./csv.ts";
export { type Money, withEdits } from "./editedBill.ts";
export { type EditedFile, readEditedBill } from "./editedRows.ts";
export { BILL_FORMATS, type BillFormat, billText } from "./formats.ts";
export { markdownText } from "./markdown.ts";
export { visible, visibleJson, visibleLines } from "./visible.ts";
