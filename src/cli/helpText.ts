// The examples and explanations that close each help page.

const STATUS = `
Exit status: 0 done; 1 no layout possible, or a check failed; 2 wrong use or unreadable input; 70 a bug of ours.`;

const BRIEF = `
BRIEF is a JSON file; - reads it from standard input. A flag beats the file, which beats the defaults.
Put BRIEF before --catalog, which takes every name after it.`;

const LAYOUT = `
The layout is given by --part, --series, --parallel and --ties, or by --layout FILE with one element of the
"layouts" of plan --json.`;

export const HELP = {
  program: `
Examples:
  $ joulewright plan brief.json --catalog mine.csv --resistors resistors.csv
  $ joulewright check brief.json --part pf-330 --series 9 --parallel 31 --ties cross-tied --catalog mine.csv
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
  $ joulewright plan --brief-schema
${BRIEF}${STATUS}`,
  check: `
Examples:
  $ joulewright check brief.json --part pf-330 --series 9 --parallel 31 --ties cross-tied --catalog mine.csv
  $ joulewright check brief.json --layout chosen.json --catalog mine.csv --json
  $ joulewright check brief.json --layout chosen.json --balance "24 kohm" --balance-tolerance "5 %" --catalog mine.csv
${LAYOUT}${BRIEF}${STATUS}`,
  order: `
Examples:
  $ joulewright order brief.json --layout chosen.json --catalog mine.csv --output order.csv
  $ joulewright order brief.json --layout chosen.json --catalog mine.csv --format md
${LAYOUT} A file that exists is replaced only with --force.${BRIEF}${STATUS}`,
  parts: `
Examples:
  $ joulewright parts mine.csv resistors.csv
  $ joulewright parts mine.csv --json
  $ joulewright parts - < mine.csv

Capacitors, resistors, fuses and measured units are told apart by their headings.${STATUS}`,
} as const;
