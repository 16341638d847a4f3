/*
 * The charge a bank still holds at a voltage, against the rules that judge by charge.
 *
 *   symbol  name         unit  range
 *   C       capacitance  F     > 0, high end
 *   V       voltage      V     >= 0
 *   Q       -            C     Q = C V
 *
 * Over a limit means strictly over: the texts ask for "no more than". A rule that does not speak of that voltage is left out.
 * Source: [IEC61010-1] 6.3.1 c), [IEC60335-1] 8.1.4, [IEC60204-1] 6.2.4, [IEC60479-2] clause 11, all second hand.
 */

import { applies, type HowRead, type Limit } from "./rule.ts";
import { type RuleId, ruleOf } from "./rules.ts";

export interface ChargeCheck {
  readonly ruleId: RuleId;
  readonly quantity: Limit["quantity"];
  readonly value: number;
  readonly limit: number;
  readonly unit: Limit["unit"];
  readonly exceeded: boolean;
  readonly tag: HowRead;
}

const JUDGES: readonly RuleId[] = [
  "iec-61010-charge",
  "iec-61010-energy",
  "iec-60335-charge",
  "iec-60204-residual",
  "iec-60479-fibrillation",
];

/** Every rule of charge, energy or capacitance that speaks of this voltage, with what the bank holds. Range: C > 0, V >= 0. */
export function chargeChecks(bank: { readonly capacitance: number; readonly voltage: number }): readonly ChargeCheck[] {
  const held: Partial<Record<Limit["quantity"], number>> = {
    charge: bank.capacitance * bank.voltage,
    energy: (bank.capacitance * bank.voltage ** 2) / 2,
    capacitance: bank.capacitance,
  };
  return JUDGES.flatMap((ruleId) => {
    const rule = ruleOf(ruleId);
    return rule.limits.flatMap((limit) => {
      const value = held[limit.quantity];
      if (value === undefined || !applies(limit, bank.voltage)) return [];
      const { quantity, unit } = limit;
      return [{ ruleId, quantity, value, limit: limit.value, unit, exceeded: value > limit.value, tag: rule.tag }];
    });
  });
}

/** Volts at which C holds no more than `charge` coulombs. Range: C > 0. Source: [textbook] Q = C V. */
export const voltageForCharge = (capacitance: number, charge: number): number => charge / capacitance;
