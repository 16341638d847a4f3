// Writes a large invented catalogue from a seed: as many rows as asked, spread and gapped like the small ones in catalogs/.
// The same rows and seed give the same bytes, so that a timing or a failure can be had again.

interface Kind {
  readonly tag: string;
  readonly technology: string;
  readonly polarised: "yes" | "no";
  /** Powers of ten of the capacitance in uF, lowest and one above the highest. */
  readonly decades: readonly [number, number];
  readonly volts: readonly number[];
  readonly tolerances: readonly string[];
  /** Leakage in uA per uF and volt, null where insulation is given instead. */
  readonly leak: number | null;
  /** Price in euro of a unit that holds one joule, and how it grows with the joules. */
  readonly price: readonly [number, number];
  /** Cubic millimetres for a joule. */
  readonly size: number;
}

const ELECTROLYTIC = ["20", "-10/+20", "-10/+30", "M", ""] as const;
const KINDS: readonly Kind[] = [
  {
    tag: "pf",
    technology: "photoflash electrolytic",
    polarised: "yes",
    decades: [2, 3.5],
    volts: [300, 330, 350, 360],
    tolerances: ELECTROLYTIC,
    leak: 0.01,
    price: [0.19, 0.7],
    size: 750,
  },
  {
    tag: "sn",
    technology: "snap-in electrolytic",
    polarised: "yes",
    decades: [2, 3.5],
    volts: [160, 200, 250, 400, 420, 450],
    tolerances: ELECTROLYTIC,
    leak: 0.01,
    price: [0.24, 0.75],
    size: 900,
  },
  {
    tag: "sc",
    technology: "screw-terminal electrolytic",
    polarised: "yes",
    decades: [3, 4.7],
    volts: [63, 100, 200, 350, 400, 450, 500],
    tolerances: ELECTROLYTIC,
    leak: 0.006,
    price: [0.4, 0.8],
    size: 1500,
  },
  {
    tag: "mf",
    technology: "metallised film",
    polarised: "no",
    decades: [0, 3],
    volts: [450, 800, 900, 1100, 1300, 2500],
    tolerances: ["5", "10", "K"],
    leak: null,
    price: [0.9, 0.75],
    size: 7000,
  },
  {
    tag: "ff",
    technology: "film-foil pulse",
    polarised: "no",
    decades: [-2, 0.5],
    volts: [1200, 1600, 2000, 4000, 10000, 20000],
    tolerances: ["5", "10", "J"],
    leak: null,
    price: [6, 0.7],
    size: 40000,
  },
  {
    tag: "op",
    technology: "oil-paper",
    polarised: "no",
    decades: [0, 2.5],
    volts: [2000, 2500, 3000, 5000, 10000],
    tolerances: ["10", "-5/+10", "20"],
    leak: null,
    price: [3, 0.7],
    size: 45000,
  },
];

const E12 = [1, 1.2, 1.5, 1.8, 2.2, 2.7, 3.3, 3.9, 4.7, 5.6, 6.8, 8.2] as const;

const HEADINGS = [
  "part",
  "maker",
  "technology",
  "polarised",
  "capacitance [uF]",
  "voltage [V]",
  "tolerance [%]",
  "leakage [uA]",
  "insulation [Mohm]",
  "esr [mohm]",
  "esl [nH]",
  "peak current [A]",
  "reversal [%]",
  "rated shots",
  "life exponent",
  "diameter [mm]",
  "length [mm]",
  "mass [g]",
  "price",
  "price breaks",
  "currency",
  "pack",
  "minimum order",
  "available",
  "supplier",
  "note",
] as const;

/** A uniform stream in [0, 1) from a 32-bit seed (mulberry32, a public-domain mixing of a counter). */
function stream(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}

const digits = (value: number, count = 3): string => String(Number(value.toPrecision(count)));

function row(index: number, next: () => number): string {
  const pick = <T>(list: readonly T[]): T => list[Math.floor(next() * list.length)]!;
  const known = (chance: number, text: string): string => (next() < chance ? text : "");
  const kind = pick(KINDS);
  const [low, high] = kind.decades;
  const exponent = Math.floor(low + next() * (high - low));
  const capacitance = Number((pick(E12) * 10 ** exponent).toPrecision(3));
  const voltage = pick(kind.volts);
  const joules = (capacitance * 1e-6 * voltage * voltage) / 2;
  const price = Math.max(0.05, kind.price[0] * joules ** kind.price[1] * (0.8 + 0.4 * next()));
  const diameter = Math.max(5, Math.cbrt((kind.size * joules) / 1.8) * 1.05);
  const length = diameter * 1.8;
  const film = kind.leak === null;
  const resistance = (film ? 20 / Math.sqrt(capacitance) : 50000 / capacitance) * (0.7 + 0.6 * next());
  const name = `big-${kind.tag}-${String(index + 1).padStart(7, "0")}`;
  return [
    name,
    `Invented Works ${String.fromCharCode(65 + Math.floor(next() * 9))}`,
    kind.technology,
    kind.polarised,
    String(capacitance),
    String(voltage),
    pick(kind.tolerances),
    kind.leak === null ? "" : known(0.85, digits(kind.leak * capacitance * voltage, 4)),
    film ? known(0.8, digits(10000 / capacitance, 4)) : "",
    known(0.9, digits(resistance)),
    known(0.5, String(15 + Math.floor(next() * 60))),
    known(0.45, digits((voltage / resistance) * (film ? 3 : 100), 2)),
    film ? known(0.7, pick(["10", "20", "50", "80"])) : known(0.3, "0"),
    known(0.35, pick(["5000", "10000", "50000", "100000"])),
    known(0.3, pick(["5", "6", "7.5", "8"])),
    known(0.95, digits(diameter)),
    known(0.95, digits(length)),
    known(0.6, digits(0.00135 * Math.PI * (diameter / 2) ** 2 * length)),
    price.toFixed(2),
    known(0.7, `10: ${(price * 0.92).toFixed(2)}; 100: ${(price * 0.78).toFixed(2)}`),
    "EUR",
    pick(["1", "1", "1", "5", "10", "50"]),
    known(0.2, pick(["10", "50", "100"])),
    known(0.4, String(Math.floor(next() * 3000))),
    pick(["Invented Supply North", "Invented Supply South"]),
    known(0.1, '"second source, sheet on request"'),
  ].join(",");
}

/** A comma-separated catalogue of `rows` invented capacitors (26 columns, about 160 bytes a row), heading included. */
export function bigCatalogue(rows: number, seed: number): string {
  const next = stream(seed);
  const lines: string[] = [HEADINGS.join(",")];
  for (let index = 0; index < rows; index++) lines.push(row(index, next));
  return `${lines.join("\n")}\n`;
}
