// `commission`: the voltages of a built bank against what its units should show, and its log over time.

import { type Answered, type Commissioned, commissionedBank } from "../commissioned.ts";
import type { CommissionFlags } from "../commissionFlags.ts";
import { commissionText, nextWords } from "../commissionText.ts";
import { EXIT } from "../exit.ts";
import type { Ports } from "../ports.ts";
import { tell } from "../tell.ts";
import { toJson } from "../toJson.ts";
import type { Watched } from "../watched.ts";
import { dateOf, watchedText } from "../watchedText.ts";

export function commissionCommand(sheet: string, flags: CommissionFlags, ports: Ports): number {
  const answer = commissionedBank(sheet, flags, ports);
  if (!answer.ok) return tell(ports, answer.refusals, flags.json);
  const { found, watched } = answer.value;
  const texts = [
    ...(found === null ? [] : [commissionText(found, ports.columns)]),
    ...(watched === null ? [] : [watchedText(watched, ports.columns)]),
  ];
  ports.out(flags.json ? commissionJson(answer.value) : texts.join("\n"));
  const due = watched?.findings.some(({ verdict }) => verdict === "fail") ?? false;
  return (found === null || found.verdict === "agrees") && !due ? EXIT.done : EXIT.unsafe;
}

const NOT_READ = { verdict: null, suspects: [], next: null } as const;

function commissionJson({ found, watched, sheet, choices }: Answered): string {
  const { ties, series, parallel, limit, voltage } = sheet;
  const { meter, resolution, charger } = choices;
  return toJson({
    ...(found === null ? NOT_READ : judged(found)),
    bank: { ties, series, parallel, limit, voltage },
    meter: { relative: meter, resolution },
    charger,
    history: watched === null ? null : dated(watched),
  });
}

function judged(found: Commissioned) {
  const { sheet: _, choices: __, ...rest } = found;
  return { ...rest, next: rest.next === null ? null : { ...rest.next, words: nextWords(found) } };
}

const day = (value: number | null): string | null => (value === null ? null : dateOf(value));

/** Days as dates, the rest as it is. */
const dated = (watched: Watched) => ({
  ...watched,
  from: dateOf(watched.from),
  to: dateOf(watched.to),
  units: watched.units.map((unit) => ({
    ...unit,
    due: unit.due.map((due) =>
      due.axis === "shots"
        ? due
        : { ...due, axis: "date", best: day(due.best), soonest: day(due.soonest), latest: day(due.latest) },
    ),
  })),
});
