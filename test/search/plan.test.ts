// The front door: the demo, the other benches, money of two kinds, and the same input giving the same bytes.
import { describe, expect, test } from "vitest";
import { type Capacitor, readCapacitors } from "../../src/catalog/index.ts";
import { plan, planCurrency } from "../../src/search/index.ts";
import { RANKINGS } from "../../src/search/rank.ts";
import { briefOf, fixtureBrief, labParts, labResistors, must } from "../support/labParts.ts";
import { slowRequired } from "../support/slowPlan.ts";

const demo = { brief: fixtureBrief("flash-lamp"), parts: labParts, families: labResistors };
const parts = (text: string): readonly Capacitor[] => must(readCapacitors(text, "c.csv")).parts;

describe("plan(input): the demo", () => {
  const all = must(plan({ ...demo, limit: 0 }));
  test("991.735537 uF are required", () => expect(all.required.capacitance).toBeCloseTo(991.735537e-6, 12));
  test("every part gives a layout or a reason, none both", () => {
    const planned = new Set(all.layouts.map((l) => l.part));
    const refused = all.refused.map((r) => r.part);
    expect([...planned].filter((p) => refused.includes(p))).toEqual([]);
    expect([...planned, ...refused].sort()).toEqual(labParts.map((u) => u.part).sort());
    expect(all.searched).toEqual({ parts: labParts.length, layouts: all.layouts.length, proof: "exhaustive" });
  });
  test("every reason has a limit that its value breaks, or no value", () => {
    for (const r of all.refused)
      if (r.value !== null && r.limit !== null) expect(r.value, `${r.part} ${r.reason}`).toBeGreaterThan(r.limit);
  });
  test("each layout gives the energy, is safe, and has no stage, no unit and no joule too few by one less in parallel", () => {
    for (const l of all.layouts) {
      const unit = labParts.find((u) => u.part === l.part)!;
      const least = unit.capacitance * (1 - (unit.tolerance?.low ?? 0));
      expect((least * l.parallel) / l.series, l.id).toBeGreaterThanOrEqual(all.required.capacitance * (1 - 2e-9));
      if (l.parallel > 1) expect((least * (l.parallel - 1)) / l.series, l.id).toBeLessThan(all.required.capacitance);
      if (l.share.charging !== null) expect(l.share.charging, l.id).toBeLessThanOrEqual(l.share.limit * (1 + 1e-9));
      if (l.share.holding !== null) expect(l.share.holding, l.id).toBeLessThanOrEqual(l.share.limit * (1 + 1e-9));
    }
  });
  test("the front is whole whatever the limit, and every id of it is a layout", () => {
    const ids = all.layouts.map((l) => l.id);
    expect(all.front.every((id) => ids.includes(id))).toBe(true);
    for (const limit of [1, 20]) {
      const few = must(plan({ ...demo, limit }));
      expect(few.front).toEqual(all.front);
      expect(few.layouts.map((l) => l.id)).toEqual(ids.slice(0, limit));
    }
  });
  test("20 unless said", () => expect(must(plan(demo)).layouts.length).toBe(20));
  test("same input, same bytes; the order of the parts does not matter", () => {
    const bytes = JSON.stringify(must(plan({ ...demo, limit: 0 })));
    expect(JSON.stringify(must(plan({ ...demo, limit: 0 })))).toBe(bytes);
    const turned = must(plan({ ...demo, parts: [...labParts].reverse(), limit: 0 }));
    expect(turned.layouts.map((l) => l.id)).toEqual(all.layouts.map((l) => l.id));
    expect([...turned.front].sort()).toEqual([...all.front].sort());
  });
  test("in bare SI numbers the same", () => {
    const si = must(plan({ ...demo, brief: fixtureBrief("flash-lamp-si") }));
    expect(si.layouts).toEqual(must(plan(demo)).layouts);
  });
  test.each(RANKINGS)("ranked by %s: that figure never falls among what is assessed", (rank) => {
    const { layouts } = must(plan({ ...demo, limit: 100, rank }));
    const figure = (k: number): number => {
      const l = layouts[k]!;
      const value = rank === "cost" ? (l.cost?.capacitors === null ? null : (l.cost?.total ?? null)) : l[rank];
      return value ?? Number.POSITIVE_INFINITY;
    };
    const assessed = layouts.filter((l) => l.stress !== null).length;
    for (let k = 1; k < assessed; k++) expect(figure(k), layouts[k]!.id).toBeGreaterThanOrEqual(figure(k - 1));
  });
});

describe("plan(input): the other benches", () => {
  test.each(["pulsed-magnet", "spot-welder", "steady-rules", "flash-lamp-bounded", "flash-lamp-nominal"])(
    "%s: something fits; the capacitance is the larger of pulse and steady current",
    (file) => {
      const brief = fixtureBrief(file);
      const made = must(plan({ ...demo, brief }));
      expect(made.layouts.length).toBeGreaterThan(0);
      expect(Math.abs(made.required.capacitance / slowRequired(brief) - 1)).toBeLessThan(1e-12);
    },
  );
  test("spot-welder: 0.666666667 F; steady-rules: 0.625 F", () => {
    expect(must(plan({ ...demo, brief: fixtureBrief("spot-welder") })).required.capacitance).toBeCloseTo(
      0.666666667,
      9,
    );
    expect(must(plan({ ...demo, brief: fixtureBrief("steady-rules") })).required.capacitance).toBeCloseTo(0.625, 12);
  });
  test("flash-lamp-bounded: every ceiling is kept", () => {
    const brief = fixtureBrief("flash-lamp-bounded");
    for (const l of must(plan({ ...demo, brief, limit: 0 })).layouts) {
      expect(l.cost?.total, l.id).toBeLessThanOrEqual(brief.maxCost as number);
      expect(l.volume, l.id).toBeLessThanOrEqual(brief.maxVolume as number);
      expect(l.mass, l.id).toBeLessThanOrEqual(brief.maxMass as number);
      expect(l.units, l.id).toBeLessThanOrEqual(brief.maxUnits);
      expect(l.series, l.id).toBeLessThanOrEqual(brief.maxSeries);
    }
  });
});

describe("plan(input): nothing", () => {
  test("no parts: no layouts, no front, no reasons", () =>
    expect(must(plan({ ...demo, parts: [] }))).toMatchObject({ layouts: [], front: [], refused: [] }));
  test("no resistor family at all: only what needs none", () => {
    const { layouts } = must(plan({ ...demo, families: [], limit: 0 }));
    expect(layouts.filter((l) => l.series > 1 && l.share.holding !== null)).toEqual([]);
    expect(layouts.length).toBeGreaterThan(0);
  });
});

describe("plan(input): stock", () => {
  test("on hand is used first and free: 20 of 20 on hand cost nothing", () => {
    const made = must(
      plan({
        brief: briefOf({ energy: 8, voltage: 400, derating: 1 }),
        parts: parts("part,capacitance [uF],voltage [V],tolerance [%],price,currency,on hand\na,100,450,0,10,EUR,20\n"),
      }),
    );
    expect(made.layouts[0]?.purchase.capacitors).toMatchObject({ fromHand: 1, bought: 0, cost: 0 });
  });
  // Packs of four and five to be had: one pack is four, two are eight. The reason should not read "5 of 5".
  test("stock that packs make too short is told with a value above the limit", () => {
    const made = must(
      plan({
        brief: briefOf({ energy: 40, voltage: 400, derating: 1 }),
        parts: parts("part,capacitance [uF],voltage [V],tolerance [%],pack,available\na,100,450,0,4,5\n"),
        quick: true,
      }),
    );
    const [reason] = made.refused;
    expect(reason?.reason).toBe("stock");
    expect(reason?.value).toBeGreaterThan(reason?.limit as number);
  });
});

describe("plan(input): money", () => {
  const mixed = parts(
    "part,capacitance [uF],voltage [V],tolerance [%],price,currency\na,1000,450,20,3.00,EUR\nb,1000,450,20,3.00,USD\n",
  );
  const brief = briefOf({ energy: 50, voltage: 400 });
  test("two currencies without a rate are refused", () => {
    const made = plan({ brief, parts: mixed });
    expect(!made.ok && made.refusals[0]?.code).toBe("two-currencies");
  });
  test("with a rate each part is in the plan's currency", () => {
    const made = must(
      plan({ brief: briefOf({ energy: 50, voltage: 400, currency: "EUR", exchange: { USD: 0.5 } }), parts: mixed }),
    );
    expect(made.currency).toBe("EUR");
    const of = (part: string) => made.layouts.find((l) => l.part === part)?.cost?.total;
    expect(of("b")).toBe((of("a") as number) / 2);
  });
  test("a currency of the brief that no catalogue has is refused without a rate", () => {
    const made = plan({ brief: briefOf({ energy: 50, voltage: 400, currency: "GBP" }), parts: mixed });
    expect(!made.ok && made.refusals[0]?.code).toBe("two-currencies");
  });
  test("no price anywhere: no currency, no cost, and still ranked", () => {
    const bare = parts("part,capacitance [uF],voltage [V],tolerance [%]\na,1000,450,20\n");
    expect(must(planCurrency(brief, bare, []))).toBe(null);
    expect(must(plan({ brief, parts: bare })).layouts[0]?.cost).toBe(null);
  });
  // 3.90 in no currency, planned in yen: 390 yen, a hundred times too much.
  test("a price in no named currency is the brief's, also where that has no minor unit", () => {
    const bare = parts("part,capacitance [uF],voltage [V],tolerance [%],price\na,1000,450,20,390\n");
    expect(
      must(plan({ brief: briefOf({ energy: 50, voltage: 400, currency: "JPY" }), parts: bare })).layouts[0]?.cost
        ?.capacitors,
    ).toBe(390);
  });
});

describe("plan(input): names", () => {
  // Two catalogues may name a part alike; two layouts of one plan may not.
  test("every id of a plan is there once, also when two files name a part alike", () => {
    const made = plan({
      brief: briefOf({ energy: 50, voltage: 400 }),
      parts: [
        ...parts("part,capacitance [uF],voltage [V],tolerance [%]\na,1000,450,20\n"),
        ...parts("part,capacitance [uF],voltage [V],tolerance [%]\na,2200,450,20\n"),
      ],
      limit: 0,
    });
    const ids = made.ok ? made.value.layouts.map((l) => l.id) : [];
    expect(new Set(ids).size).toBe(ids.length);
  });
});

describe("plan(input): what the states at rest add", () => {
  const planned = must(plan({ ...demo, brief: { ...demo.brief, hold: 30 }, limit: 5 }));

  test("improve is that of the best: its baseline is the best itself; quick leaves it out", () => {
    const [best] = planned.layouts;
    expect(planned.improve?.baseline).toMatchObject({ id: best?.id, units: best?.units, cost: best?.cost?.total });
    expect(planned.improve?.causes.map(({ cause }) => cause).sort()).toEqual(
      ["capacitance tolerance", "derating", "leakage", "overshoot", "resistor tolerance"].sort(),
    );
    expect(must(plan({ ...demo, limit: 1, quick: true })).improve).toBeUndefined();
  });

  test("every layout says what it would be without resistors; they do not change which layouts there are", () => {
    for (const one of planned.layouts) {
      if (one.series === 1) expect(one.withoutBalance).toBeNull();
      else
        expect(one.withoutBalance?.safe).toBe(
          (one.withoutBalance?.holding ?? Number.NaN) <= one.share.limit * (1 + 1e-9),
        );
    }
  });

  test("a part that no resistor keeps safe is refused with what would mend it", () => {
    const text = "part,capacitance [uF],voltage [V],tolerance [%],leakage [uA],polarised\nu,1000,450,0.5,100,yes\n";
    const family = labResistors.slice(0, 1).map((one) => ({ ...one, tolerance: 0.2 }));
    const brief = briefOf({ voltage: 1600, energy: 100, maxSeries: 4 });
    const [refusal] = must(plan({ brief, parts: parts(text), families: family })).refused;
    expect(refusal?.reason).toBe("balance");
    expect(refusal?.mends?.series).toBeGreaterThan(4);
    // (n V_lim - V)/(V + (n - 2) V_lim) = 20/2410, by methods 2.2.
    expect(refusal?.mends?.tolerance).toBeLessThanOrEqual(20 / 2410);
    expect(refusal?.mends?.tolerance).toBeGreaterThan(0.005);
    expect(refusal?.mends?.voltage).toBeLessThan(1600);
  });

  test("the statistical best keeps its own stated risk, error counted against it", () => {
    const brief = { ...demo.brief, basis: "statistical" as const };
    const some = labParts.filter(({ file }) => file === "electrolytic.csv");
    for (const one of must(plan({ ...demo, parts: some, brief, limit: 10 })).layouts) {
      const finding = one.findings.find(({ id }) => id === "charging-risk");
      if (one.share.charging !== null) expect(finding?.verdict, one.id).toBe("pass");
    }
  }, 20_000);
});
