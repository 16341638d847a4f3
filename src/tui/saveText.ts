// Saves a text in a file; a file that is there is only replaced when that was said.
import type { Files } from "../cli/index.ts";

/** How saving ended: done, the file is there already, or why not in plain words. */
export type SaveAnswer =
  | { readonly kind: "saved"; readonly path: string }
  | { readonly kind: "exists"; readonly path: string }
  | { readonly kind: "trouble"; readonly words: string };

export function saveText(files: Pick<Files, "write">, text: string, path: string, replace: boolean): SaveAnswer {
  const written = files.write(path, text, replace);
  if (written.ok) return { kind: "saved", path };
  const [refusal] = written.refusals;
  if (refusal?.code === "file-exists") return { kind: "exists", path };
  return {
    kind: "trouble",
    words: `${(refusal?.code ?? "unknown").replaceAll("-", " ")}; needed: ${refusal?.want ?? ""}`,
  };
}
