// Places measured units into a bank: the whole way from readings to a certified placing.
import { accepted, type Finding, type Read, refused } from "../quantity/index.ts";
import { candidatesOf, outlierFindings, wildFindings } from "./candidates.ts";
import { solveCharging } from "./charging.ts";
import { conductancesOf } from "./conductance.ts";
import { constrainedStart, type Start } from "./constrainedStart.ts";
import { constraintsOf } from "./constraints.ts";
import { effort, settle, share } from "./effort.ts";
import { gapFinding, holdingUnknown, mixedParts } from "./flags.ts";
import { gapFloor, honestDigits, voltageUncertainty } from "./floor.ts";
import { worstShare } from "./gap.ts";
import { type Held, holdAgain, holdFreely } from "./holding.ts";
import { toLattice } from "./lattice.ts";
import { outliersOf } from "./outliers.ts";
import { type Placing, serialsOf, settled } from "./placing.ts";
import { seeded } from "./random.ts";
import { checkRequest, DEFAULTS, type PlaceRequest } from "./request.ts";
import { isOptimal, type SearchStep } from "./solution.ts";
import { keepOrder } from "./spareOrder.ts";
import { lotUncertainty, type MeasuredUnit } from "./unit.ts";

/** Below this part of the floor a smaller gap costs nothing that could be measured (it adds under 1 % in squares). */
const FLOOR_STOP = 0.1;
/** Of the floor, what charging may give up for holding (adds under 5 % in squares). */
const FLOOR_GIVEN = 0.3;
const HOLDING_MOVES = 400_000;
/** Above this count the best possible is not reached to the last digit, and so much of a gap is no loss for holding. */
const SMALL = 40;
const FREE = 8e-7;
const HOLDING_TRIES = 2;

/**
 * Places `units` as asked. Yields where the search stands; returns the placing, or why there can be none.
 * Deterministic for one request unless its `within` says stop: the same seed and moves give the same result.
 *
 * @param units measured units, at least series x parallel of them
 * @returns the placing with its gaps, lower bound and findings; refusals for duplicate serials, too few units, bad numbers,
 *   pins or lots that cannot be honoured
 */
export function* placing(
  units: readonly MeasuredUnit[],
  request: PlaceRequest,
): Generator<SearchStep<string>, Read<Placing>> {
  const checked = checkRequest(units, request);
  if (!checked.ok) return checked;
  const { series, parallel, ties } = request;
  const uncertainty = request.uncertainty ?? lotUncertainty(units) ?? DEFAULTS.uncertainty;
  const outliers = outliersOf(units, uncertainty);
  const { units: pool, rejected } = candidatesOf(units, request, outliers);
  const rule = constraintsOf(pool, request);
  const { values } = toLattice(pool.map((unit) => unit.capacitance));
  const order = keepOrder(pool, new Set(outliers.map((o) => o.serial)));
  const start: Start = rule.any ? constrainedStart(rule, order, values) : { ok: true, groups: [] };
  if (!start.ok) {
    return refused({
      code: "place.constraints",
      place: { field: "pins" },
      read: start.why,
      want: "wishes that fit together",
    });
  }
  const random = seeded(request.seed ?? DEFAULTS.seed);
  const work = effort(request.moves ?? DEFAULTS.moves, request.within);
  const conductances = conductancesOf(pool, request);
  const judged = conductances.known && series > 1;
  const shape = { series, parallel, ties, uncertainty };
  const floor = gapFloor(shape);
  const stopAt = request.stopAt ?? (request.stopAtFloor === false ? 0 : FLOOR_STOP * floor);
  const prove = request.stopAtFloor !== true && request.stopAt === undefined;

  const large = pool.length > SMALL;
  const level = large && request.goal === "charging";
  const reserve = judged
    ? Math.min(level ? Number.POSITIVE_INFINITY : HOLDING_TRIES * HOLDING_MOVES, work.moves / 2)
    : 0;
  const charging = share(work, work.moves - reserve);
  const task = { ties, values, rule, order, start: start.groups, stopAt, prove };
  const named = (standing: SearchStep["standing"]) => () => serialsOf(pool, standing());
  const search = solveCharging(task, random, charging);
  let found = search.next();
  for (; !found.done; found = search.next()) yield { ...found.value, standing: named(found.value.standing) };
  const solution = found.value;
  settle(work, charging);

  const holdingFloor = gapFloor({ ...shape, uncertainty: request.leakageUncertainty ?? DEFAULTS.leakageUncertainty });
  let held: Held | null = null;
  if (conductances.known) {
    const goals = { ties, values, rule, conductances, target: FLOOR_STOP * holdingFloor, spares: false };
    const both = { ...goals, limit: Math.max(solution.gap, request.chargingLimit ?? FLOOR_GIVEN * floor) };
    const moves = judged ? Math.min(HOLDING_MOVES, reserve) : 0;
    const steps =
      request.goal === "charging"
        ? holdFreely(solution, { ...both, moves, slack: large ? FREE : 0 }, { random, work })
        : holdAgain(solution.groups, { ...both, moves }, { tries: HOLDING_TRIES, random, work });
    let step = steps.next();
    for (; !step.done; step = steps.next()) {
      const standing = named(() => solution.groups);
      yield { phase: "holding", gap: step.value.charging, moves: work.spent, standing };
    }
    held = step.value;
  }

  const groups = settled(held?.groups ?? solution.groups, rule.any);
  const gap = held?.gaps.charging ?? solution.gap;
  const lowerBound = Math.min(solution.lowerBound, gap);
  const fitted = new Set(groups.flat());
  const spares = order.filter((i) => !fitted.has(i)).map((i) => pool[i]!.serial);
  const fittedSerials = new Set(groups.flat().map((i) => pool[i]!.serial));
  const findings: Finding[] = [gapFinding("charging", gap, floor)];
  if (!conductances.known) findings.push(holdingUnknown(conductances));
  else findings.push(gapFinding("holding", held!.gaps.holding, holdingFloor));
  findings.push(...outlierFindings(outliers, fittedSerials));
  findings.push(...wildFindings(units, request, { outliers, fitted: fittedSerials, gap: solution.gap }));
  findings.push(...mixedParts(pool, groups));
  return accepted({
    ties,
    series,
    parallel,
    groups: serialsOf(pool, groups),
    spares: [...spares, ...new Set(rejected.map((o) => o.serial))],
    rejected,
    charging: {
      worst: worstShare(gap, series),
      gap,
      lowerBound,
      boundKind: solution.boundKind,
      certified: gap - lowerBound,
      proof: isOptimal({ gap, lowerBound }) ? "optimal" : "within",
      attained: solution.gap,
      plusMinus: voltageUncertainty(shape),
    },
    holding: held
      ? { worst: worstShare(held.gaps.holding, series), gap: held.gaps.holding, floor: holdingFloor }
      : null,
    floor,
    digits: honestDigits(voltageUncertainty(shape)),
    moves: work.spent,
    findings,
  });
}

/** `placing` run to its end. */
export function place(units: readonly MeasuredUnit[], request: PlaceRequest): Read<Placing> {
  const steps = placing(units, request);
  let step = steps.next();
  while (!step.done) step = steps.next();
  return step.value;
}
