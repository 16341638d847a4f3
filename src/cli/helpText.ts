// The examples and explanations that close each help page.

import { GOVERNING } from "./governing.ts";

const STATUS = `
Exit status: 0 done; 1 no layout possible, or a check failed; 2 wrong use or unreadable input; 70 a bug of ours.`;

const BRIEF = `
BRIEF is a JSON file; - reads it from standard input. A flag beats the file, which beats the defaults.
Put BRIEF before --catalog, which takes every name after it.`;

const LAYOUT = `
The layout is given by --part, --series, --parallel and --ties, or by --layout FILE with one element of the
"layouts" of plan --json.`;

/** Ids, as many on a line as fit. */
function governing(): string {
  const lines = [" "];
  for (const id of GOVERNING) {
    const last = lines[lines.length - 1] as string;
    if (last.length + id.length + 1 > 76) lines.push(`  ${id}`);
    else lines[lines.length - 1] = `${last} ${id}`;
  }
  return lines.join("\n");
}

export const HELP = {
  program: `
Without a command the screens open, on the invented demo catalogues or on your own:
  joulewright [--catalog FILE...] [--resistors FILE] [--brief FILE] [--ascii] [--dark|--light]
Where there is no terminal, joulewright alone prints the plan of the demo brief.

Examples:
  $ joulewright --catalog mine.csv --brief brief.json
  $ joulewright plan brief.json --catalog mine.csv --resistors resistors.csv
  $ joulewright check brief.json --part pf-330 --series 9 --parallel 31 --ties cross-tied --catalog mine.csv
  $ joulewright pulse brief.json --layout chosen.json --catalog mine.csv --load-resistance "0.9 ohm"
  $ joulewright order brief.json --layout chosen.json --catalog mine.csv --output order.csv
  $ joulewright parts mine.csv
${STATUS}
Stored energy can kill with the supply switched off. This is a calculation, not an approval.`,
  plan: `
Examples:
  $ joulewright plan --energy "2.4 kJ" --voltage "2.2 kV" --ripple "100 %" --catalog mine.csv theirs.csv
  $ joulewright plan brief.json --catalog mine.csv --rank volume --limit 5
  $ joulewright plan - --catalog mine.csv --json < brief.json
  $ joulewright plan brief.json --catalog mine.csv --resistors resistors.csv --blend --explain --within "2 %"
  $ joulewright plan brief.json --catalog mine.csv --blend --shipment-cost "North: 4.90; 6.50" --front volume --ladder "50 %"
  $ joulewright plan --brief-schema

A blend is a mix of whole strings of different parts. With limits on the shot it is the cheapest that is proven to keep
them: for that the ESR and ESL of every part of a mix must be known, and the load be a resistance, a coil or a short.

With a load, --max-peak-current, --max-reversal and the other limits on the shot are kept in the search: for each shape
the least parallel count that keeps them all. A limit that cannot be judged, for want of a rating, refuses the part.
--fuses, --isolating with its price and --section-inductance with its price put that protection into the cost that ranks.
${BRIEF}${STATUS}`,
  check: `
Examples:
  $ joulewright check brief.json --part pf-330 --series 9 --parallel 31 --ties cross-tied --catalog mine.csv
  $ joulewright check brief.json --layout chosen.json --catalog mine.csv --json
  $ joulewright check brief.json --layout chosen.json --balance "24 kohm" --balance-tolerance "5 %" --catalog mine.csv
  $ joulewright check brief.json --layout chosen.json --basis statistical --witness 1e6 --seed 7 --catalog mine.csv
  $ joulewright check brief.json --layout chosen.json --basis statistical --measured lot.csv --catalog mine.csv
  $ joulewright check brief.json --blend "el-470 4s7p cross-tied + pf-330 2s3p strings" --catalog mine.csv
${LAYOUT}${BRIEF}${STATUS}`,
  pulse: `
Examples:
  $ joulewright pulse --voltage "2 kV" --load-resistance "0.9 ohm" --load-inductance "25 uH" \\
      --part op-100 --series 1 --parallel 1 --catalog mine.csv
  $ joulewright pulse brief.json --layout chosen.json --catalog mine.csv --waveform shot.csv --fuses fuses.csv
  $ joulewright plan --energy "200 J" --lamp-bore "8 mm" --lamp-arc "100 mm" --lamp-gas xenon \\
      --lamp-pressure "450 torr" --lamp-width "500 us" --catalog mine.csv

The load is one of: a resistance, with or without an inductance; a lamp; a short; a steady current for a time; a
recorded current. The loop is load, bus, switch and the bank's own ESR and ESL (n/p of a unit's). What is unknown is
left out and every figure it bears on is called a bound. Without a bus, a load with both resistance and inductance
(0 counts) stands for everything outside the bank. No energy and no fall need be asked here.
A lamp with --lamp-width and --energy sets voltage and coil where they are not given; pulse then says how far the bank
that can be built lands from that circuit. The lamp's datasheet comes first.
With --bus-feed and the stretch of bus from unit to unit (--bus-pitch, or its measured steps) each unit's place on the
bus counts: which one carries most, by how much, and what another feed would do.
${LAYOUT}${BRIEF}${STATUS}`,
  order: `
Examples:
  $ joulewright order brief.json --layout chosen.json --catalog mine.csv --output order.csv
  $ joulewright order brief.json --layout chosen.json --catalog mine.csv --format md
  $ joulewright order brief.json --layout chosen.json --catalog mine.csv --edited order.csv --output order.csv --force

--edited takes a bill as CSV back from a spreadsheet. Kept are rows of your own (a blank or "own line" under line), columns
of your own, and what you wrote under item, value, rating, quantity needed, on hand, pack, unit price, currency, supplier,
order code, alternates, status and note; all else is reckoned anew. A row with your quantity is reckoned from its own
cells, without price breaks; a price alone leaves the quantities. A blank cell of yours stays blank; delete a row to have it made anew. The column "mark"
tells what is yours: leave it as it is. What was taken over is told, what was beside another part is not taken over, and
where the bank now asks something else of what you chose, it says so.
${LAYOUT} A file that exists is replaced only with --force.${BRIEF}${STATUS}`,
  place: `
Examples:
  $ joulewright place --series 6 --parallel 10 --ties cross-tied --measured lot.csv
  $ joulewright place --series 6 --parallel 10 --ties strings --measured lot.csv --voltage "2 kV" --output list.csv
  $ joulewright place brief.json --layout chosen.json --catalog mine.csv --measured lot.csv --json > bank.json
  $ joulewright place --series 6 --parallel 10 --ties cross-tied --measured lot.csv --positions list.csv --without pf-014
A plain shape is enough: --part, --catalog, BRIEF and --voltage add limits, resistors and voltages.
Same file, seed and moves: same list, byte for byte.${STATUS}`,
  sheet: `
Examples:
  $ joulewright sheet brief.json --layout chosen.json --catalog mine.csv --output sheet.html
  $ joulewright sheet brief.json --layout chosen.json --catalog mine.csv --measured lot.csv --paper letter \\
      --revision B --date "2 March" --rule nec-460-6 --output sheet.html
  $ joulewright sheet brief.json --layout chosen.json --catalog mine.csv --format md

One HTML file that needs nothing else: no script, nothing fetched; print it from any browser. What is not known is left
blank to fill in, with what it blocks. Rules for --rule, each told in the hazard file whichever governs:
${governing()}
${LAYOUT} A file that exists is replaced only with --force.${BRIEF}${STATUS}`,
  labels: `
Examples:
  $ joulewright labels brief.json --layout chosen.json --catalog mine.csv --measured lot.csv --output labels.html
  $ joulewright labels brief.json --layout chosen.json --catalog mine.csv --paper letter --output labels.html
One label for every unit, stage or string, and spare, with serial, position, polarity and rating; without --measured the
serials are lines to fill in. Print at full size and cut along the frames.
${LAYOUT} A file that exists is replaced only with --force.${BRIEF}${STATUS}`,
  commission: `
Examples:
  $ joulewright commission bank.json --readings readings.csv --unit-limit "324 V"
  $ joulewright commission bank.json --readings readings.csv --meter "0.2 %" --resolution "0.1 V" --json
  $ joulewright commission bank.json --readings readings.csv --next-voltage "1.6 kV" --next-hold "10 min"
  $ joulewright commission bank.json --history log.csv --capacitance-lost "10 %" --esr-grown "100 %"
SHEET is what place --json wrote. A row of readings is one reading: stage (cross-tied), or string and place, or serial.
A row of a history is dated: shots (a counter) or fired (since the row before), and with a serial what was measured anew.
Exit status: 0 agrees; 1 differs, stop, or a unit is due; 2 wrong use or unreadable input; 70 a bug of ours.`,
  parts: `
Examples:
  $ joulewright parts mine.csv resistors.csv
  $ joulewright parts mine.csv --json
  $ joulewright parts - < mine.csv

Capacitors, resistors, fuses and measured units are told apart by their headings.${STATUS}`,
  completion: `
Examples:
  $ joulewright completion bash > ~/.local/share/bash-completion/completions/joulewright
  $ joulewright completion zsh > ~/.zfunc/_joulewright
  $ joulewright completion fish > ~/.config/fish/completions/joulewright.fish

For one session of bash: source <(joulewright completion bash). For zsh the folder must be in fpath before compinit runs.
${STATUS}`,
  manual: `
Examples:
  $ joulewright manual | man -l -
  $ joulewright manual > joulewright.1

An installed package brings the page along: man joulewright.
${STATUS}`,
} as const;
