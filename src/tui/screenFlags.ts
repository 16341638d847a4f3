// Tells whether the arguments ask for the screens, and on which catalogues and brief.
import { parseArgs } from "node:util";

export interface ScreenFlags {
  /** Capacitor catalogues; empty for those that come with the program. */
  readonly catalog: readonly string[];
  readonly resistors: string | null;
  readonly brief: string | null;
  readonly ascii: boolean;
  /** The terminal's ground, for its colours; null finds out. */
  readonly ground: "dark" | "light" | null;
}

const OF_A_FILE: readonly string[] = ["--catalog", "--resistors", "--brief"];

/**
 * No argument at all, or only the flags of the screens: `--catalog FILE...`, `--resistors FILE`, `--brief FILE`, `--ascii`, `--dark`, `--light`.
 * A flag whose file is missing is named. Null for anything else, which is the commands' to understand or to refuse.
 */
export function screenFlags(argv: readonly string[]): ScreenFlags | { readonly missing: string } | null {
  // "--catalog a.csv b.csv" means two catalogues, as it does for the commands.
  const spread: string[] = [];
  let list = "";
  for (const word of argv) {
    if (word.startsWith("--") && word !== "--") {
      list = word === "--catalog" ? word : "";
      if (list !== "") continue;
    } else if (list !== "") spread.push(list);
    spread.push(word);
  }
  const missing = argv.find((word, at) => OF_A_FILE.includes(word) && (argv[at + 1] ?? "--").startsWith("--"));
  try {
    const { values } = parseArgs({
      args: missing === undefined ? spread : spread.filter((word) => word !== missing),
      strict: true,
      allowPositionals: false,
      options: {
        catalog: { type: "string", multiple: true },
        resistors: { type: "string" },
        brief: { type: "string" },
        ascii: { type: "boolean" },
        dark: { type: "boolean" },
        light: { type: "boolean" },
      },
    });
    if (missing !== undefined) return { missing };
    const { catalog = [], resistors = null, brief = null, ascii = false, dark, light } = values;
    if (dark && light) return null;
    return { catalog, resistors, brief, ascii, ground: dark ? "dark" : light ? "light" : null };
  } catch {
    return null;
  }
}
