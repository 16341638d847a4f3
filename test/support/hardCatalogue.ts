// Large banks from scarce stock under tight ceilings: the regime in which the own search gives up its share and hands on.
import { chance } from "./random.ts";

export interface HardCase {
  readonly csv: string;
  readonly brief: Readonly<Record<string, unknown>>;
}

export function hardCase(seed: number, count = 60): HardCase {
  const c = chance(seed);
  const rows = Array.from({ length: count }, (_, i) => {
    const farads = Math.round(c.between(50, 900));
    const price = farads * c.between(0.018, 0.026);
    const size = farads * c.between(0.8, 1.25);
    const [diameter, length] = [30, (size * 1000) / 900];
    const breaks = `"${c.whole(4, 9)}: ${(price * 0.93).toFixed(2)}; ${c.whole(12, 30)}: ${(price * 0.84).toFixed(2)}"`;
    const mass = size * c.between(0.9, 1.1);
    return `hard-${i};no;${farads};400;10;1;${diameter};${length.toFixed(1)};${mass.toFixed(1)};${price.toFixed(2)};${breaks};EUR;${c.pick([1, 1, 2, 5])};${c.whole(4, 40)}`;
  });
  const heading =
    "part;polarised;capacitance [uF];voltage [V];tolerance [%];leakage [uA];diameter [mm];length [mm];mass [g];price;price breaks;currency;pack;available";
  const need = 0.1 * c.between(0.8, 1.2);
  return {
    csv: [heading, ...rows].join("\n"),
    // One in series: C = 2E/V^2, the volume a little above what an average part would take.
    brief: {
      energy: ((need * 360 ** 2) / 2) * 0.35,
      voltage: 360,
      ripple: 1,
      maxVolume: Number((need * 0.35 * 1e6 * 1.04e-6 * 0.97).toPrecision(4)),
      maxMass: Number((need * 0.35 * 1e6 * 1.06e-3).toPrecision(4)),
      currency: "EUR",
    },
  };
}
