// The commands, their flags and their help, on commander; each command's code is loaded when it is called.

import { Command, CommanderError, Option } from "commander";
import { visibleLines } from "../order/index.ts";
import { type BlendFlags, wantsBlend } from "./blendFlags.ts";
import { BRIEF_FLAGS, FLAG_GROUPS } from "./briefFlags.ts";
import type { CheckFlags } from "./commands/check.ts";
import type { OrderFlags } from "./commands/order.ts";
import type { PartsFlags } from "./commands/parts.ts";
import type { PlanFlags } from "./commands/plan.ts";
import type { PulseFlags } from "./commands/pulse.ts";
import type { CommissionFlags } from "./commissionFlags.ts";
import { EXIT } from "./exit.ts";
import { HELP } from "./helpText.ts";
import type { PlaceFlags } from "./placeFlags.ts";
import type { Ports } from "./ports.ts";
import type { SheetFlags } from "./sheetFlags.ts";
import { VERSION } from "./version.ts";

type Done = (status: number) => void;

function withBrief(command: Command): Command {
  command.argument("[brief]", "brief file, JSON; - is standard input");
  for (const { flag, argument, help, group } of BRIEF_FLAGS) {
    const option = new Option(`${flag} ${argument}`.trim(), help);
    command.addOption(group === undefined ? option : option.helpGroup(FLAG_GROUPS[group]));
  }
  return command
    .option("--catalog <file...>", "capacitor catalogues, CSV; may be repeated; - is standard input")
    .option("--resistors <file>", "resistor catalogue, CSV; without it an assumed family is used")
    .option("--json", "print JSON");
}

function withLayout(command: Command): Command {
  return withBrief(command)
    .option("--part <name>", "the unit capacitor, by its name in the catalogues")
    .option("--series <count>", "units in series")
    .option("--parallel <count>", "units or strings in parallel")
    .option("--ties <ties>", "cross-tied or strings")
    .option("--layout <file>", "one layout (check and order: or blend) of plan --json; - is standard input")
    .option("--balance <resistance>", 'fix the balancing resistor, "24 kohm", or none')
    .option("--balance-tolerance <tolerance>", 'its tolerance, "5 %"');
}

/** What the paper is made with beside the layout. */
function withPaper(command: Command): Command {
  return command
    .option("--measured <file>", "measured units, CSV: serials, places and bands come from them")
    .option("--positions <file>", "with --measured: take this list of positions as built")
    .option("--uncertainty <fraction>", 'of one measured capacitance against another, "0.3 %"')
    .option("--earth <end>", "negative, positive, none or unknown: the end at the earth point")
    .option("--paper <paper>", "A4 or Letter", "A4")
    .option("--output <file>", "write to a file, whole or not at all")
    .option("--force", "replace the file if it exists");
}

/** The whole command tree. */
export function build(ports: Ports, done: Done): Command {
  const program = new Command("joulewright");
  const say = (write: (text: string) => void) => (text: string) => write(visibleLines(text));
  program
    .description("Plans, checks and buys a pulsed-power capacitor bank from the capacitors you own or can buy.")
    .version(VERSION)
    .exitOverride()
    .configureOutput({
      writeOut: say(ports.out),
      writeErr: say(ports.err),
      getOutHelpWidth: () => ports.columns,
      getErrHelpWidth: () => ports.columns,
    })
    .showSuggestionAfterError(true)
    .showHelpAfterError("(see --help)")
    .addHelpText("after", HELP.program);
  withBrief(program.command("plan"))
    .description("Find every layout that does the job, ranked.")
    .option("--limit <count>", "how many layouts are printed; 0 for all", "20")
    .option("--rank <by>", "cost, units, volume, mass or stress", "cost")
    .option(
      "--measured <file>",
      "measured units, CSV: for the basis measured, where they decide how many in series, or statistical, drawn from them",
    )
    .option("--part <name>", "the part that was measured")
    .option("--uncertainty <fraction>", "of one measured capacitance against another")
    .option("--brief-schema", "print the JSON Schema of the brief and stop")
    .addHelpText("after", HELP.plan)
    .option("--blend", "also find the cheapest mix of whole strings of different parts, with its proof")
    .option("--fuses <file>", "fuse catalogue, CSV: a fuse for each unit, the cheapest that does, counted in the cost")
    .option("--explain", "with --blend: the proof in words, and what prices and limits are worth")
    .option("--max-types <count>", "with --blend: most parts in one bank; 4 unless told")
    .option("--within <fraction>", 'with --blend: other kinds of blend up to so much dearer, "2 %"')
    .option("--line-cost <amount>", "with --blend: what ordering each part costs as such")
    .option("--shipment-cost <amounts>", 'with --blend: what a shipment costs, "6.50" or "North: 4.90; South: 12"')
    .option("--front <names>", 'with --blend: least cost against "volume, mass, units, stress"')
    .option("--ladder <fraction>", 'with --blend: cost steps from so much less energy to so much more, "50 %"')
    .option("--solver-time <time>", 'with --blend: time for the outside solver in hard cases; "10 s" unless told')
    .action(async (brief: string | undefined, flags: PlanFlags & BlendFlags) => {
      if (wantsBlend(flags)) {
        const { planBlendCommand } = await import("./commands/planBlend.ts");
        return done(await planBlendCommand(brief, flags, ports));
      }
      const { planCommand } = await import("./commands/plan.ts");
      done(planCommand(brief, flags, ports));
    });
  withLayout(program.command("check"))
    .description("Check one layout in every state at rest.")
    .option("--blend <text>", 'a blend instead of one layout, "PART 6s10p cross-tied + PART 2s3p strings"')
    .option("--shipment-cost <amounts>", 'with a blend: what a shipment costs, "6.50" or "North: 4.90; South: 12"')
    .option("--measured <file>", "measured units, CSV: the statistical basis draws from them")
    .option("--witness <banks>", "draw so many banks beside the statistical chance, 1e6")
    .option("--seed <number>", "seed of the drawing (default: 1)")
    .option("--workers <count>", "threads that draw; the result is the same at any number")
    .addHelpText("after", HELP.check)
    .action(async (brief: string | undefined, flags: CheckFlags) => {
      const { checkWitnessed } = await import("./commands/check.ts");
      done(await checkWitnessed(brief, flags, ports));
    });
  withLayout(program.command("pulse"))
    .description("Fire one layout: current, reversal, energies, heat, life, and what a fault does.")
    .option("--fuses <file>", "fuse catalogue, CSV: the cheapest that lives through the shot and clears the fault")
    .option("--waveform <file>", "write time, current and voltage as CSV")
    .option("--force", "replace the file if it exists")
    .addHelpText("after", HELP.pulse)
    .action(async (brief: string | undefined, flags: PulseFlags) => {
      const { pulseCommand } = await import("./commands/pulse.ts");
      done(pulseCommand(brief, flags, ports));
    });
  withLayout(program.command("order"))
    .description("Write the bill of materials of one layout.")
    .option("--blend <text>", 'a blend instead of one layout, "PART 6s10p cross-tied + PART 2s3p strings"')
    .option("--shipment-cost <amounts>", 'with a blend: what a shipment costs, "6.50" or "North: 4.90; South: 12"')
    .option("--fuses <file>", "fuse catalogue, CSV: adds a fuse for each unit to the bill")
    .option("--edited <file>", "an edited bill, CSV: its own lines, prices and choices are kept; - is standard input")
    .option("--format <format>", "csv, json, md or html; else by the ending of --output, else csv")
    .option("--output <file>", "write to a file, whole or not at all")
    .option("--force", "replace the file if it exists")
    .addHelpText("after", HELP.order)
    .action(async (brief: string | undefined, flags: OrderFlags) => {
      const { orderCommand } = await import("./commands/order.ts");
      done(orderCommand(brief, flags, ports));
    });
  withLayout(program.command("place"))
    .description("Place measured units, each where the voltages come out most equal.")
    .option("--measured <file>", "measured units, CSV: serial, capacitance, and where known leakage, esr, lot")
    .option("--uncertainty <fraction>", 'of one capacitance against another, "0.3 %"')
    .option("--leakage-uncertainty <fraction>", 'of one leakage reading, "10 %"')
    .option("--leakage-at <voltage>", "voltage on a unit at which leakage was read")
    .option("--unit-limit <voltage>", "highest voltage of a unit; else the part's, derated")
    .option("--pins <pins...>", "units that must stand in a stage or string: SERIAL=3, or a list in CSV")
    .option("--rooms <rooms...>", "stages or strings that take only one polarity or size group: 3=snap-in")
    .option("--lots <wish>", "mix: every lot spread evenly; apart: one lot to a stage or string")
    .option("--outliers <wish>", "reject or keep units that do not belong to the lot")
    .option("--goal <goal>", "charging, or both: charging within its floor, then holding")
    .option("--stop-at-floor", "stop where the meter cannot tell better placings apart")
    .option("--seed <number>", "seed of the search")
    .option("--moves <count>", "how many elementary trials the search may make")
    .option("--front", "show what holding costs in charging")
    .option("--positions <file>", "take this list of positions as built, and judge it")
    .option("--without <serial>", "show the fewest changes when this unit comes out")
    .option("--format <format>", "text, csv or json; else by the ending of --output")
    .option("--output <file>", "write the list to a file, whole or not at all")
    .option("--force", "replace the file if it exists")
    .addHelpText("after", HELP.place)
    .action(async (brief: string | undefined, flags: PlaceFlags) => {
      const { placeCommand } = await import("./commands/place.ts");
      done(placeCommand(brief, flags, ports));
    });
  withPaper(withLayout(program.command("sheet")))
    .description("Write the build sheet of one layout: drawings, wiring, tests, limits, hazard file.")
    .option("--fuses <file>", "fuse catalogue, CSV: the fuse that does is drawn and wired")
    .option("--rule <id>", "the rule that governs bleed times; else the brief's touch-safe voltage")
    .option("--date <text>", "printed as given; no clock is read")
    .option("--revision <text>", "printed as given")
    .option("--format <format>", "html, md or json; else by the ending of --output, else html")
    .addHelpText("after", HELP.sheet)
    .action(async (brief: string | undefined, flags: SheetFlags) => {
      const { sheetCommand } = await import("./commands/sheet.ts");
      done(sheetCommand(brief, flags, ports));
    });
  withPaper(withLayout(program.command("labels")))
    .description("Write labels to print and cut: units, stages or strings, spares.")
    .option("--format <format>", "html or json; else by the ending of --output, else html")
    .addHelpText("after", HELP.labels)
    .action(async (brief: string | undefined, flags: SheetFlags) => {
      const { labelsCommand } = await import("./commands/labels.ts");
      done(labelsCommand(brief, flags, ports));
    });
  program
    .command("commission")
    .description("Compare the voltages of a built bank with what its units should show.")
    .argument("<sheet>", "the JSON of place, or one layout of plan or check; - is standard input")
    .option("--readings <file>", "readings, CSV: time [s], charge voltage [V], stage, voltage [V], total, current")
    .option("--meter <fraction>", 'uncertainty of a voltage reading, "0.5 %"')
    .option("--resolution <voltage>", 'its last digit and zero error, "0.1 V"')
    .option("--unit-limit <voltage>", "highest voltage of a unit; else the sheet's")
    .option("--balance <resistance>", "balancing resistor as fitted, or none; else the sheet's")
    .option("--charger <state>", "on: it held the voltage; off: taken off after the charge")
    .option("--next-voltage <voltage>", "charge voltage of the next step of the hot test")
    .option("--next-hold <time>", "how long it would be held")
    .option("--history <file>", "shot log and units measured anew, CSV: date, shots, serial, capacitance, esr, leakage")
    .option("--capacitance-lost <fraction>", 'end of life of a unit: this part of its capacitance lost, "20 %"')
    .option("--esr-grown <fraction>", 'end of life of a unit: its ESR grown by this part, "100 %"')
    .option("--leakage-most <current>", "end of life of a unit: leakage at its test voltage")
    .option("--json", "print JSON")
    .addHelpText("after", HELP.commission)
    .action(async (sheet: string, flags: CommissionFlags) => {
      const { commissionCommand } = await import("./commands/commission.ts");
      done(commissionCommand(sheet, flags, ports));
    });
  program
    .command("parts")
    .description("Read catalogues and say what was understood, row by row.")
    .argument("<files...>", "catalogues, CSV; - is standard input")
    .option("--limit <count>", "how many rows of each file are told; 0 for all", "0")
    .option("--json", "print JSON")
    .addHelpText("after", HELP.parts)
    .action(async (paths: readonly string[], flags: PartsFlags) => {
      const { partsCommand } = await import("./commands/parts.ts");
      done(partsCommand(paths, flags, ports));
    });
  program
    .command("completion")
    .description("Print a script that completes commands and options in a shell.")
    .argument("<shell>", "bash, zsh or fish")
    .addHelpText("after", HELP.completion)
    .action(async (shell: string) => {
      const { completionCommand } = await import("./commands/completion.ts");
      const { treeOf } = await import("./commandTree.ts");
      done(completionCommand(shell, treeOf(program), ports));
    });
  program
    .command("manual")
    .description("Print the manual page, for man.")
    .addHelpText("after", HELP.manual)
    .action(async () => {
      const { manualCommand } = await import("./commands/manual.ts");
      const { treeOf } = await import("./commandTree.ts");
      done(manualCommand(treeOf(program), ports));
    });
  return program;
}

/** Help asked of a command that there is none of is the slip to tell; commander would show the general help instead. */
function slipOf(program: Command, argv: readonly string[]): readonly string[] {
  const name = argv[0] === "help" ? argv[1] : argv[0];
  const known = name === undefined || name.startsWith("-") || name === "help";
  return known || program.commands.some((command) => command.name() === name) ? argv : [name];
}

/** Runs one command line without the program's name; the exit status. Throws only for a bug of ours. */
export async function run(argv: readonly string[], ports: Ports): Promise<number> {
  let status: number = EXIT.done;
  const program = build(ports, (found) => {
    status = found;
  });
  try {
    await program.parseAsync([...slipOf(program, argv)], { from: "user" });
    return status;
  } catch (error) {
    if (!(error instanceof CommanderError)) throw error;
    return error.exitCode === 0 ? EXIT.done : EXIT.wrongUse;
  }
}
