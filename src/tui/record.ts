// The recorded current that the form names by its file, read in its place; what is wrong with it is told at the field.
import { type Files, withRecord } from "../cli/index.ts";
import { type Read, refused } from "../quantity/index.ts";

type Node = Readonly<Record<string, unknown>>;

/** The form's field of the file. */
const FIELD = "load.recorded";

/**
 * Puts the samples of the file into a brief's input. The form is read at every key, so a file that has not changed is not taken
 * apart again. Refused, at the field: standard input, which is the keyboard here, and whatever is wrong with the file.
 */
export function recordReader(files: Pick<Files, "read">): (input: Node) => Read<Node> {
  let last: { readonly text: string; readonly path: string; readonly samples: unknown } | null = null;
  return (input) => {
    const load = input.load as Node | undefined;
    const path = typeof load === "object" && load !== null && !Array.isArray(load) ? load.recorded : undefined;
    if (typeof path !== "string") return { ok: true, value: input };
    if (path.trim() === "-") {
      const want = "the name of a file; the keyboard is taken by the screens";
      return refused({ code: "bad-value", place: { field: FIELD }, read: JSON.stringify(path), want });
    }
    const text = files.read(path.trim());
    if (text.ok && last !== null && last.path === path && last.text === text.value)
      return { ok: true, value: { ...input, load: { ...load, recorded: last.samples } } };
    const one: Pick<Files, "read"> = { read: () => text };
    const read = withRecord({ ...input, load: { ...load, recorded: path.trim() } }, one);
    if (!read.ok) return refused(...read.refusals.map((one) => ({ ...one, place: { ...one.place, field: FIELD } })));
    const { recorded } = read.value.load as Node;
    if (text.ok) last = { text: text.value, path, samples: recorded };
    return read;
  };
}
