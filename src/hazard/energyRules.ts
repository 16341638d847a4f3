// What published rules say of stored energy, of charge through a body and of voltage that comes back, a row each.

import { charge, energy, type Rule, share } from "./rule.ts";

export const ENERGY_RULES = [
  {
    id: "vehicle-low-energy",
    body: "Vehicle safety (UN GTR discussion, SAE J1766)",
    clause: "",
    edition: "",
    tag: "second hand",
    words: "A high-voltage bus that holds less than 0.2 J counts as low in energy.",
    limits: [energy(0.2)],
  },
  {
    id: "iec-60479-fibrillation",
    body: "IEC 60479-2",
    clause: "11",
    edition: "",
    tag: "second hand",
    words:
      "A discharge through the heart is judged by its charge: mostly without harm below 3 mC, one in two fibrillates at 5 mC.",
    limits: [charge(3e-3), charge(5e-3)],
  },
  {
    id: "nfpa-70e-360",
    body: "NFPA 70E",
    clause: "Article 360",
    edition: "2021, 2024",
    tag: "second hand",
    words:
      "Stored energy is a hazard from 100 J below 100 V, from 1 J at 100 V and above, from 0.25 J at 400 V and above. " +
      "Whether a value just at the limit counts was not read; here it does.",
    limits: [energy(100, { below: 100 }), energy(1, { from: 100, below: 400 }), energy(0.25, { from: 400 })],
  },
  {
    id: "lbnl-shock",
    body: "Lawrence Berkeley Lab, electrical safety pages",
    clause: "table 2.2.13",
    edition: "",
    tag: "read",
    words:
      "A capacitor is a shock hazard from 10 J at 100 V and above: ten times laxer than the 1 J tier, which is used here.",
    limits: [energy(10, { from: 100 })],
  },
  {
    id: "lbnl-thermal",
    body: "Lawrence Berkeley Lab, electrical safety pages",
    clause: "table 2.3.3",
    edition: "",
    tag: "read",
    words: "Below 100 V a capacitor is a burn hazard over 100 J.",
    limits: [energy(100, { below: 100 })],
  },
  {
    id: "lbnl-arc-blast",
    body: "Lawrence Berkeley Lab, electrical safety pages",
    clause: "table 2.3.5",
    edition: "",
    tag: "read",
    words: "From 10 kJ at 100 V and above an arc flashes and blasts: hearing, eyes and distance.",
    limits: [energy(10e3, { from: 100 })],
  },
  {
    id: "absorption-electrolytic",
    body: "Common experience, public notes",
    clause: "",
    edition: "",
    tag: "second hand",
    words: "A wet aluminium electrolytic regains 10 % to 15 % of the voltage it soaked at after a short discharge.",
    limits: [share(0.1), share(0.15)],
  },
  {
    id: "absorption-other",
    body: "A. D. Moore, Electrostatics",
    clause: "",
    edition: "",
    tag: "second hand",
    words: "Even a good capacitor may regain up to about 10 %.",
    limits: [share(0.1)],
  },
] as const satisfies readonly Rule[];
