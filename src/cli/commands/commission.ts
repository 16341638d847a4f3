// `commission`: the voltages of a built bank against what its units should show.

import { type Commissioned, commissionedBank } from "../commissioned.ts";
import type { CommissionFlags } from "../commissionFlags.ts";
import { commissionText, nextWords } from "../commissionText.ts";
import { EXIT } from "../exit.ts";
import type { Ports } from "../ports.ts";
import { tell } from "../tell.ts";
import { toJson } from "../toJson.ts";

export function commissionCommand(sheet: string, flags: CommissionFlags, ports: Ports): number {
  const found = commissionedBank(sheet, flags, ports);
  if (!found.ok) return tell(ports, found.refusals, flags.json);
  ports.out(flags.json ? commissionJson(found.value) : commissionText(found.value, ports.columns));
  return found.value.verdict === "agrees" ? EXIT.done : EXIT.unsafe;
}

function commissionJson(found: Commissioned): string {
  const { sheet, choices, ...rest } = found;
  const { ties, series, parallel, limit, voltage } = sheet;
  const { meter, resolution, charger } = choices;
  return toJson({
    ...rest,
    next: rest.next === null ? null : { ...rest.next, words: nextWords(found) },
    bank: { ties, series, parallel, limit, voltage },
    meter: { relative: meter, resolution },
    charger,
  });
}
