// Writes an invented instance as the programme a general solver would be given: packs, tiers and strings as variables.
import { capacityNeeded, roomUnder } from "../../src/search/blend/evaluate.ts";
import type { Program, ProgramColumn, ProgramRow } from "../../src/search/blend/program.ts";
import type { Instance } from "./blendInstances.ts";

/**
 * Strings x, packs and a chosen tier for each part. `tight` adds x <= X z and leaves out tiers that stock or need rules out;
 * otherwise the programme is as a person would first write it.
 */
export function tierProgram(instance: Instance, tight: boolean): Program {
  const { model, parts } = instance;
  const columns: ProgramColumn[] = [];
  const rows: ProgramRow[] = [];
  const open = Number.POSITIVE_INFINITY;
  const need = capacityNeeded(model.requirement);
  const capacity: [number, number][] = [];
  const volume: [number, number][] = [];
  const mass: [number, number][] = [];
  const chosen: [number, number][] = [];
  const add = (cost: number, most: number): number => columns.push({ cost, most, whole: true }) - 1;
  parts.forEach((part, k) => {
    const option = model.options[k]!;
    const most = Math.min(
      option.maxStrings,
      Math.floor(roomUnder(model.ceilings.volume) / option.volume),
      Math.floor(roomUnder(model.ceilings.mass) / option.mass),
    );
    if (most < 1) return;
    const x = add(part.series * part.resistor, most);
    capacity.push([x, option.capacity / need]);
    volume.push([x, option.volume / roomUnder(model.ceilings.volume)]);
    mass.push([x, option.mass / roomUnder(model.ceilings.mass)]);
    const units: [number, number][] = [[x, -part.series]];
    const any: [number, number][] = [];
    part.tiers.forEach((tier, t) => {
      const low = Math.max(tier.from, part.minimum);
      let high = Math.min(part.stock, (part.tiers[t + 1]?.from ?? open) - 1);
      if (tight) high = Math.min(high, Math.max(low + part.pack - 1, part.series * most + part.pack - 1));
      const fewest = Math.ceil(low / part.pack);
      const packs = Math.floor(high / part.pack);
      if (tight ? packs < fewest : high < low) return;
      const p = add(part.pack * tier.price, packs);
      const z = add(part.fixed, 1);
      units.push([p, part.pack]);
      any.push([z, 1]);
      chosen.push([z, 1]);
      rows.push({
        terms: [
          [p, part.pack],
          [z, -(tight ? fewest * part.pack : low)],
        ],
        least: 0,
        most: open,
      });
      rows.push({
        terms: [
          [p, part.pack],
          [z, -(tight ? packs * part.pack : high)],
        ],
        least: -open,
        most: 0,
      });
    });
    rows.push({ terms: units, least: 0, most: open });
    rows.push({ terms: any, least: -open, most: 1 });
    if (tight)
      rows.push({ terms: [[x, 1], ...any.map(([z]) => [z, -most] as [number, number])], least: -open, most: 0 });
  });
  rows.push({ terms: capacity, least: 1, most: open });
  rows.push({ terms: volume, least: -open, most: 1 });
  rows.push({ terms: mass, least: -open, most: 1 });
  rows.push({ terms: chosen, least: -open, most: model.maxTypes });
  return { columns, rows };
}
