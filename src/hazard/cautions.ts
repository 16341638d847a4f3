// The standing cautions and the words by which this program defers to standards and people, short and long, as data.

/** What a bank is like, as far as cautions go. */
export interface Traits {
  readonly polarised?: boolean;
  readonly seriesUnits?: boolean;
  readonly arcBlast?: boolean;
  readonly oilFilled?: boolean;
  readonly homeMade?: boolean;
  readonly doubleLayer?: boolean;
}

export interface Caution {
  readonly id: string;
  /** `always`, or the trait that calls for it. */
  readonly when: "always" | keyof Traits;
  /** One line of at most 78 characters. */
  readonly short: string;
  readonly long: string;
}

export const CAUTIONS: readonly Caution[] = [
  {
    id: "kills-when-off",
    when: "always",
    short: "A charged bank can kill with its supply switched off and unplugged.",
    long: "The energy is in the bank, not in the mains. Switching off removes nothing. Treat every unit as charged until you have measured it yourself.",
  },
  {
    id: "measure-then-short",
    when: "always",
    short: "Measure, discharge through a resistor, measure again, then short and leave it.",
    long: "Use a stick with a resistor first, then a meter rated for the full voltage, and only at zero a solid short. A solid short on a charged bank burns, blinds and throws metal. Leave the strap on.",
  },
  {
    id: "two-paths",
    when: "always",
    short: "A bleed resistor may have failed open: have two ways to discharge, trust none.",
    long: "A resistor that has failed looks like one that has not. Fit a permanent bleed and a switched dump that closes when power fails, each on the bank's side of every switch and plug, and prove both.",
  },
  {
    id: "comes-back",
    when: "always",
    short: "Voltage comes back after a short: keep the strap on until work is done.",
    long: "The dielectric gives back part of the voltage it was held at, minutes after a short. Electrolytics may regain 10 % to 15 %. Loose and spare units need a strap too.",
  },
  {
    id: "eyes-and-ears",
    when: "always",
    short: "Screen the bank; wear eye and hearing protection for every shot.",
    long: "A unit that fails may burst. All its neighbours in parallel empty into it. Stand behind a screen that stops fragments, with eyes and ears covered, and let nobody stand in line with vents and terminals.",
  },
  {
    id: "not-alone",
    when: "always",
    short: "Never charge alone: a second person knows the switch, the stick and first aid.",
    long: "A second person within sight, who can cut the supply, use the stick and start resuscitation, is part of the bank. So is a key or an interlock that keeps everybody else out.",
  },
  {
    id: "ends-are-not-units",
    when: "seriesUnits",
    short: "Zero volts at the ends is not zero on each unit: measure and short each stage.",
    long: "Unequal units in series keep equal and opposite charges after a dump, while the ends read nothing. Cans and mid-points may stand at half the bank's voltage. Bleed, measure and short each stage.",
  },
  {
    id: "reverse",
    when: "polarised",
    short: "Reverse voltage spoils these units and may burst them: damp or clamp the shot.",
    long: "Check polarity with a second person. Keep the discharge at or over critical damping, or fit clamp diodes rated for the surge. Old units are formed again through a resistor before use.",
  },
  {
    id: "blast",
    when: "arcBlast",
    short: "Over 10 kJ an arc is a blast: control it from another room or behind a wall.",
    long: "From 10 kilojoules the pressure and noise of an arc are a hazard apart from shock. Discharge by remote means, keep an exclusion area, and have the distances set by someone qualified.",
  },
  {
    id: "old-oil",
    when: "oilFilled",
    short: "Oil-filled units made before about 1980 may hold PCB: do not open or drill.",
    long: "Read the label and the date. A can that cannot be shown to be free of PCB is handled and got rid of by the rules of your country; a leaking one is not handled at all.",
  },
  {
    id: "home-made-air",
    when: "homeMade",
    short: "Air in a home-made stack glows and burns long before the sheet breaks down.",
    long: "The tabulated strength of the sheet is not the strength of the stack: the field in a bubble or at an edge is higher. Test behind a screen at a fraction of the voltage, with no flammable oil in the open.",
  },
  {
    id: "low-volts-burn",
    when: "doubleLayer",
    short: "A few volts here still drive thousands of amperes: no rings, no loose tools.",
    long: "Double-layer units cannot shock at one cell's voltage, but they weld, burn and spray metal when shorted. Take off rings and watches, insulate tools, cover terminals.",
  },
];

export const DEFERENCE: readonly { readonly id: string; readonly short: string; readonly long: string }[] = [
  {
    id: "not-approval",
    short: "This is a calculation, not an approval.",
    long: "The standard in force where you work, the maker's data sheet and the person responsible for your lab decide. Have a competent person check the design before anything is charged.",
  },
  {
    id: "rules-second-hand",
    short: "Limits marked second hand or memory were not read in the text: look them up.",
    long: "Every limit says who set it and how far its text was read here. One marked second hand comes from a public page that quotes it; one marked memory from neither. Neither may stand in a safety file unread.",
  },
  {
    id: "clearance-advice",
    short: "Distances are advice: the standard's table ends at 1 500 V dc and 2 000 m.",
    long: "Above those values the figures here are drawn out beyond what the standard covers. Test with the full voltage and a margin before you rely on a gap.",
  },
];

/** The cautions that a bank calls for, the standing ones first. */
export const cautionsFor = (traits: Traits): readonly Caution[] =>
  CAUTIONS.filter((caution) => caution.when === "always" || traits[caution.when] === true);
