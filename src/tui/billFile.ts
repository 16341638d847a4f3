// Saves an order in a file whose ending names the format; a file that is there is only replaced when that was said.
import type { Files } from "../cli/index.ts";
import { BILL_FORMATS, type Bill, type BillFormat, billText } from "../order/index.ts";
import type { SaveAnswer } from "./ports.ts";
import { saveText } from "./saveText.ts";

/** Format by the file's ending; null for one that is not known. */
export function formatOf(path: string): BillFormat | null {
  const ending = /\.([a-z]+)$/i.exec(path)?.[1]?.toLowerCase() ?? "";
  return BILL_FORMATS.find((format) => format === ending) ?? null;
}

export function saveBill(files: Pick<Files, "write">, bill: Bill, path: string, replace: boolean): SaveAnswer {
  const format = formatOf(path);
  if (format === null) {
    return { kind: "trouble", words: `the name must end in one of ${BILL_FORMATS.map((one) => `.${one}`).join(", ")}` };
  }
  return saveText(files, billText(bill, format), path, replace);
}
