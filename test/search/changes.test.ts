// Least changes: each one really makes something fit, names a layout that is then there, and one per cent less does not do.
import { describe, expect, test } from "vitest";
import { type Capacitor, type ResistorFamily, readCapacitors, readResistors } from "../../src/catalog/index.ts";
import { type Brief, type Change, plan, readBrief } from "../../src/search/index.ts";
import { briefOf, fixtureBrief, labParts, must } from "../support/labParts.ts";
import { chance } from "../support/random.ts";
import { smallBrief, smallCatalogue, smallResistors } from "../support/smallCatalogue.ts";

interface Job {
  readonly brief: Brief;
  readonly parts: readonly Capacitor[];
  readonly families?: readonly ResistorFamily[];
}

const ids = (job: Job): readonly string[] => must(plan({ ...job, limit: 0, quick: true })).layouts.map((l) => l.id);
const changesOf = (job: Job): readonly Change[] => must(plan(job)).changes;

/** The job with a field at another value; stock is the part's named in the note. */
function changed(job: Job, change: Change, to: number): Job {
  if (change.field !== "available") return { ...job, brief: { ...job.brief, [change.field]: to } };
  return { ...job, parts: job.parts.map((u) => (u.part === change.note ? { ...u, available: to } : u)) };
}

/** One per cent nearer to what was asked, or one piece nearer where pieces are counted. */
function less({ field, from, to }: Change): number {
  if (["maxSeries", "maxUnits", "available"].includes(field)) return to - 1;
  const nearer = to > (from ?? 0) ? to * 0.99 : to * 1.01;
  return (from as number) < to ? Math.max(nearer, from as number) : Math.min(nearer, from as number);
}

function verify(job: Job, change: Change, at: string): void {
  const name = `${at} ${change.field} ${change.from} to ${change.to}`;
  const there = ids(changed(job, change, change.to));
  expect(there.length, `${name} makes something fit`).toBeGreaterThan(0);
  expect(there, `${name} gives the layout it names`).toContain(change.layout);
  expect(ids(changed(job, change, less(change))), `${name}: less does not do`).toEqual([]);
}

describe("leastChanges", () => {
  test("nothing is proposed where something fits", () =>
    expect(changesOf({ brief: fixtureBrief("flash-lamp"), parts: labParts })).toEqual([]));
  test("no parts, no changes", () => expect(changesOf({ brief: fixtureBrief("flash-lamp"), parts: [] })).toEqual([]));

  test.each(["energy", "series", "units", "cost", "volume", "mass", "derating"])(
    "impossible/%s.json: that field is among the changes, and each change holds",
    (file) => {
      const job = { brief: fixtureBrief(`impossible/${file}`), parts: labParts };
      const found = changesOf(job);
      const field =
        { series: "maxSeries", units: "maxUnits", cost: "maxCost", volume: "maxVolume", mass: "maxMass" }[file] ?? file;
      expect(found.map((c) => c.field)).toContain(field);
      for (const change of found) verify(job, change, file);
    },
  );
  test("impossible/ripple.json: a larger fall is proposed and does", () => {
    const job = { brief: fixtureBrief("impossible/ripple"), parts: labParts };
    const change = changesOf(job).find((c) => c.field === "ripple");
    expect(change).toBeDefined();
    verify(job, change as Change, "ripple");
  });
  test("impossible/voltage.json: a lower voltage is proposed", () =>
    expect(changesOf({ brief: fixtureBrief("impossible/voltage"), parts: labParts }).map((c) => c.field)).toContain(
      "voltage",
    ));

  // The search for a voltage stops at a quarter of the one asked.
  test("two in series of 50 V units for 1 kV: a voltage of 90 V is proposed", () => {
    const parts = must(
      readCapacitors("part,capacitance [uF],voltage [V],tolerance [%],leakage [uA]\na,1000,50,0,0\n", "c.csv"),
    ).parts;
    const brief = briefOf({ energy: 0.1, voltage: "1 kV", ripple: 1, maxSeries: 2 });
    expect(changesOf({ brief, parts }).map((c) => c.field)).toContain("voltage");
  });

  test("60 random jobs that nothing meets, for want of energy, derating or stock: every change of every field holds", () => {
    const seen = new Map<string, number>();
    let impossible = 0;
    for (let i = 0; impossible < 60 && i < 600; i++) {
      const c = chance(5000 + i);
      const read = must(readCapacitors(smallCatalogue(c), "c.csv")).parts;
      const families = must(readResistors(smallResistors(c), "r.csv")).families;
      const asked = must(readBrief(smallBrief(c, ["for ever"])));
      const brief: Brief = {
        ...asked,
        energy: asked.energy * (i % 3 === 0 ? c.between(2, 40) : 1),
        derating: asked.derating * (i % 3 === 1 ? c.between(0.1, 0.6) : 1),
      };
      const parts = i % 3 === 2 ? read.map((u) => ({ ...u, onHand: 0, available: c.whole(0, 3) })) : read;
      const job = { brief, parts, families };
      if (ids(job).length > 0) continue;
      impossible++;
      for (const change of changesOf(job)) {
        verify(job, change, `case ${i}`);
        seen.set(change.field, (seen.get(change.field) ?? 0) + 1);
      }
    }
    expect(impossible).toBe(60);
    const fields = ["energy", "voltage", "ripple", "derating", "maxUnits", "available"];
    expect([...seen.keys()]).toEqual(expect.arrayContaining(fields));
  });

  test("stock: the least that must be to be had, also where a price break makes more of them cheaper", () => {
    const text =
      "part,capacitance [uF],voltage [V],tolerance [%],leakage [uA],price,price breaks,currency,available\na,100,450,0,0,10,20: 1,EUR,3\n";
    const job = {
      brief: briefOf({ energy: 80, voltage: 400, ripple: 1 }),
      parts: must(readCapacitors(text, "c.csv")).parts,
    };
    const change = changesOf(job).find((c) => c.field === "available");
    expect(change).toMatchObject({ from: 3, note: "a" });
    verify(job, change as Change, "stock");
  });
});
