// The flags of the brief: one row a key, read by the help, by the settings and by every refusal that names a flag.

import { type BriefFlag, SHOT_FLAGS } from "./shotFlags.ts";

export { type BriefFlag, FLAG_GROUPS } from "./shotFlags.ts";

const BANK_FLAGS: readonly BriefFlag[] = [
  { flag: "--title", argument: "<text>", key: "title", help: "name of the bank" },
  { flag: "--energy", argument: "<energy>", key: "energy", help: 'energy of one pulse, such as "2.4 kJ"' },
  { flag: "--voltage", argument: "<voltage>", key: "voltage", help: 'charge voltage, such as "2.2 kV"' },
  {
    flag: "--ripple",
    argument: "<fall>",
    key: "ripple",
    help: 'allowed fall in voltage, "20 %"; "100 %" is a full dump',
  },
  { flag: "--basis", argument: "<basis>", key: "basis", help: "worst case, nominal, statistical or measured" },
  { flag: "--risk", argument: "<fraction>", key: "risk", help: "risk of the statistical basis" },
  {
    flag: "--distribution",
    argument: "<law>",
    key: "distribution",
    help: "uniform or normal: how capacitance lies in its tolerance, for the statistical basis",
  },
  { flag: "--derating", argument: "<fraction>", key: "derating", help: 'part of a rating that is used, "90 %" or 0.9' },
  {
    flag: "--overshoot",
    argument: "<fraction>",
    key: "overshoot",
    help: "overshoot of the charger over the charge voltage",
  },
  { flag: "--ageing", argument: "<fraction>", key: "ageing", help: "loss of capacitance over life, counted in energy" },
  { flag: "--hold", argument: "<time>", key: "hold", help: 'how long the bank stays charged, "30 s" or "for ever"' },
  { flag: "--touch-safe", argument: "<voltage>", key: "touchSafe", help: "voltage that counts as safe to touch" },
  { flag: "--touch-safe-rule", argument: "<text>", key: "touchSafeRule", help: "the rule that sets this voltage" },
  { flag: "--max-series", argument: "<count>", key: "maxSeries", help: "most units in series" },
  { flag: "--max-units", argument: "<count>", key: "maxUnits", help: "most units in the bank" },
  { flag: "--max-cost", argument: "<amount>", key: "maxCost", help: "most it may cost, in the currency of the plan" },
  { flag: "--max-volume", argument: "<volume>", key: "maxVolume", help: 'most room for units, "5 L"' },
  { flag: "--max-mass", argument: "<mass>", key: "maxMass", help: 'most mass of units, "60 kg"' },
  { flag: "--spares", argument: "<count>", key: "spares", help: "spare units bought with the bank" },
  { flag: "--currency", argument: "<code>", key: "currency", help: "currency of the plan, ISO 4217" },
  { flag: "--exchange", argument: "<code=rate...>", key: "exchange", help: "rate of another currency, USD=0.92" },
  {
    flag: "--steady-current",
    argument: "<current>",
    key: "steady.current",
    help: "steady current drawn between recharges",
  },
  {
    flag: "--steady-frequency",
    argument: "<frequency>",
    key: "steady.frequency",
    help: "how often the charger tops up",
  },
  { flag: "--rate", argument: "<rate>", key: "rate", help: 'shots, "0.1 Hz"' },
  {
    flag: "--dump-resistance",
    argument: "<resistance>",
    key: "dumpResistance",
    help: "resistor that empties the bank; sets the clamp diodes' surge",
  },
  { flag: "--ambient", argument: "<temperature>", key: "ambient", help: 'air around the bank, "30 degC"' },
];

export const BRIEF_FLAGS: readonly BriefFlag[] = [...BANK_FLAGS, ...SHOT_FLAGS];

/** The name under which commander hands over a flag's value. */
export const attributeOf = (flag: string): string =>
  flag.slice(2).replace(/-([a-z])/g, (_, letter: string) => letter.toUpperCase());
