// A small invented stock and the ports of the screens on it, all in memory, for tests of the screens.

import { EventEmitter } from "node:events";
import { type Capacitor, DEFAULT_FAMILY, readCapacitors } from "../../src/catalog/index.ts";
import { accepted, refused } from "../../src/quantity/index.ts";
import { catalogEngine } from "../../src/tui/catalogEngine.ts";
import type { EnginePort, SaveAnswer, ScreenPorts, Workshop } from "../../src/tui/ports.ts";
import { initialState, type State } from "../../src/tui/state.ts";
import { unitsOn } from "../../src/tui/units/work.ts";
import { SHARED_WORDS } from "../../src/tui/workshop.ts";
import { Screen } from "./screen.ts";
import { FakeKeyboard, FakeProcess } from "./tty.ts";

/** Invented parts of a teaching lab; no such thing can be bought. */
export const CATALOGUE = `part,capacitance [uF],voltage [V],tolerance [%],leakage [uA],polarised,technology,diameter [mm],length [mm],mass [g],price,currency,on hand,order code
flash-a,470,450,20,400,yes,photoflash,35,50,60,3.10,EUR,,F-A
flash-b,1000,400,20,800,yes,photoflash,40,60,90,5.20,EUR,,F-B
snap-c,2200,350,-10/+30,1500,yes,snap-in,40,80,140,,EUR,,S-C
film-d,150,1200,5,,no,metallised film,,,,38.00,EUR,20,M-D
`;

export const parts = (text = CATALOGUE): readonly Capacitor[] => {
  const read = readCapacitors(text, "test.csv");
  if (!read.ok) throw new Error(JSON.stringify(read.refusals));
  return read.value.parts;
};

export const engine = catalogEngine({ parts: parts(), families: [DEFAULT_FAMILY] });

export const CATALOGUE_FACTS = {
  parts: parts(),
  sources: [{ file: "test.csv", kind: "capacitors" as const, read: 4, faults: [], notes: [] }],
};

export const STOCK = { name: "test.csv", parts: 4, faults: 0, note: "invented" };

export const BRIEF = { energy: "2.4 kJ", voltage: "2.2 kV", ripple: "100 %" };

export const stateWith = (changes: Partial<State> = {}): State => ({
  ...initialState({
    columns: 80,
    rows: 24,
    look: { colour: false, ascii: false },
    stock: STOCK,
    values: BRIEF,
    extra: {},
  }),
  words: SHARED_WORDS,
  catalogue: CATALOGUE_FACTS,
  ...changes,
});

/** Standard output that feeds a screen and can be resized. */
export class FakeOutput extends EventEmitter {
  readonly isTTY: boolean;
  columns: number;
  rows: number;
  readonly screen: Screen;

  constructor(screen: Screen, isTTY = true) {
    super();
    this.screen = screen;
    this.isTTY = isTTY;
    this.columns = screen.term.cols;
    this.rows = screen.term.rows;
  }
  write(text: string): void {
    this.screen.feed(text);
  }
  resize(columns: number, rows: number): void {
    this.columns = columns;
    this.rows = rows;
    this.screen.term.resize(columns, rows);
    this.emit("resize");
  }
}

export interface FakePorts extends ScreenPorts {
  readonly stdin: FakeKeyboard;
  readonly stdout: FakeOutput;
  readonly process: FakeProcess;
  readonly screen: Screen;
  /** Text last saved; null before. */
  readonly kept: { session: string | null; aside: string | null };
  readonly files: Map<string, string>;
  readonly complaints: string[];
}

export function fakePorts(
  columns = 80,
  rows = 24,
  { engine: by = engine, ...changes }: Partial<ScreenPorts> & { readonly engine?: EnginePort } = {},
): FakePorts {
  const screen = new Screen(columns, rows);
  const kept: FakePorts["kept"] = { session: null, aside: null };
  const files = new Map<string, string>();
  const complaints: string[] = [];
  const exportBill: Workshop["exportBill"] = (bill, path, replace): SaveAnswer => {
    if (files.has(path) && !replace) return { kind: "exists", path };
    if (path.startsWith("/full/")) return { kind: "trouble", words: "the disk is full" };
    files.set(path, bill.layout);
    return { kind: "saved", path };
  };
  return {
    open: async () => ({
      ok: true,
      value: {
        engine: by,
        stock: changes.stock ?? STOCK,
        words: SHARED_WORDS,
        exportBill,
        units: unitsOn(parts(), {
          read: (path) => refused({ code: "no-such-file", place: { file: path }, read: "nothing", want: "a file" }),
          write: (path) => accepted(path),
        }),
        catalogue: CATALOGUE_FACTS,
        families: [DEFAULT_FAMILY],
        overrides: {},
        saveOverrides: () => ({ kind: "saved", path: "" }),
      },
    }),
    watch: () => () => {},
    stock: { ...STOCK, parts: 0 },
    brief: BRIEF,
    briefFirst: false,
    extra: {},
    loadSession: () => kept.session,
    saveSession: (text) => {
      kept.session = text;
      return null;
    },
    keepSession: () => {
      kept.aside = kept.session;
      return "session.unread";
    },
    complain: (line) => complaints.push(line),
    stdin: new FakeKeyboard(),
    stdout: new FakeOutput(screen),
    writeSync: (text) => screen.feed(text),
    process: new FakeProcess(),
    env: {},
    screen,
    kept,
    files,
    complaints,
    ...changes,
  } as FakePorts;
}
