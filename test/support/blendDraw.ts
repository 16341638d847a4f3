// One random small catalogue, its resistors and a brief, planned by the program itself.
import { type Capacitor, type ResistorFamily, readCapacitors, readResistors } from "../../src/catalog/index.ts";
import { run } from "../../src/cli/program.ts";
import { type Brief, readBrief } from "../../src/search/index.ts";
import { fakePorts } from "./fakePorts.ts";
import { must } from "./labParts.ts";
import { type Chance, chance } from "./random.ts";
import { smallBrief, smallCatalogue, smallResistors } from "./smallCatalogue.ts";

export interface Drawn {
  readonly brief: Brief;
  readonly parts: readonly Capacitor[];
  readonly families: readonly ResistorFamily[];
  readonly maxTypes: number;
  readonly texts: Readonly<Record<string, string>>;
}

const HEADING =
  "part;polarised;capacitance [uF];voltage [V];tolerance [%];leakage [uA];diameter [mm];length [mm];mass [g];price;price breaks;currency;" +
  "pack;minimum order;on hand;available;supplier";

/** Three to five parts with all that a blend asks for, most of them scarce, so that one alone seldom does. */
function scarceCatalogue(c: Chance): string {
  const rows = Array.from({ length: c.whole(3, 5) }, (_, i) => {
    const price = c.between(0.5, 30);
    const breaks = c.maybe(0.5)
      ? `"${c.whole(4, 9)}: ${(price * c.between(0.7, 1.05)).toFixed(2)}; ${c.whole(10, 30)}: ${(price * c.between(0.4, 0.9)).toFixed(2)}"`
      : "";
    return [
      `part-${i}`,
      c.pick(["yes", "no"]),
      c.pick(["47", "100", "220", "330", "470"]),
      c.pick(["200", "350", "450", "1100"]),
      c.pick(["20", "10", "-10/+50", "-10/+20"]),
      c.between(5, 2000).toFixed(0),
      c.whole(20, 60),
      c.whole(30, 100),
      c.whole(20, 300),
      c.maybe(0.9) ? price.toFixed(2) : "",
      breaks,
      "EUR",
      c.pick(["", "", "2", "5"]),
      c.pick(["", "", "6"]),
      c.pick(["", "", "5", "13"]),
      c.pick(["", "6", "10", "18", "30"]),
      c.pick(["North", "South"]),
    ].join(";");
  });
  return [HEADING, ...rows].join("\n");
}

export function draw(seed: number): Drawn {
  const c = chance(seed);
  const texts = {
    "c.csv": seed % 3 === 0 ? smallCatalogue(c, true) : scarceCatalogue(c),
    "r.csv": smallResistors(c, ["1", "5"]),
    "b.json": JSON.stringify({ ...smallBrief(c, ["for ever", "for ever", "60 s"]), energy: c.between(20, 400) }),
  };
  return {
    texts,
    brief: must(readBrief(JSON.parse(texts["b.json"]))),
    parts: must(readCapacitors(texts["c.csv"], "c.csv")).parts,
    families: must(readResistors(texts["r.csv"], "r.csv")).families,
    maxTypes: c.whole(1, 4),
  };
}

/** What `plan --blend --json` prints, and its exit status. */
export async function planned(drawn: Drawn, more: readonly string[] = []) {
  const ports = fakePorts(drawn.texts);
  const line = ["plan", "b.json", "--catalog", "c.csv", "--resistors", "r.csv", "--blend", "--limit", "1", "--json"];
  const status = await run([...line, "--max-types", String(drawn.maxTypes), ...more], ports);
  return { status, err: ports.told(), ...JSON.parse(ports.printed()) };
}

/** The same with resistors from two suppliers and what the shipments cost, cents. */
export function drawShipped(
  seed: number,
): Drawn & { readonly shipments: Readonly<Record<string, number>>; readonly flag: string } {
  const drawn = draw(seed);
  const c = chance(seed + 77);
  const [heading = "", ...rows] = drawn.texts["r.csv"]!.split("\n");
  const families = rows.map((row) => `${row},${c.pick(["North", "West", ""])}`);
  const texts = { ...drawn.texts, "r.csv": [`${heading},supplier`, ...families].join("\n") };
  const shipments = { North: c.whole(0, 15_000), "": c.whole(0, 15_000), South: 0, West: 0 };
  const cents = (amount: number): string => (amount / 100).toFixed(2);
  const names = ["North", "South", "West"].filter((name) => Object.values(texts).some((text) => text.includes(name)));
  for (const name of names) shipments[name as "South"] = c.whole(0, 15_000);
  const flag = [...names.map((name) => `${name}: ${cents(shipments[name as "South"])}`), cents(shipments[""])].join(
    "; ",
  );
  return { ...drawn, texts, families: must(readResistors(texts["r.csv"], "r.csv")).families, shipments, flag };
}
