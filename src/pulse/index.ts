// Contents page of pulse.
export { type Branch, branchShot } from "./branchShot.ts";
export { type Bus, type BusGeometry, busOf } from "./bus.ts";
export type { BusPath, BusPlace, Feed, PlaceShares } from "./busPath.ts";
export { taperOf } from "./busPlace.ts";
export { unitShort } from "./chainFaults.ts";
export { type Charge, type Charger, type ChargeTask, chargeOf } from "./charge.ts";
export {
  actionDensity,
  conductorFinding,
  leastArea,
  METALS,
  type Metal,
  onderdonkDensity,
  type Rise,
  temperatureAfter,
} from "./conductor.ts";
export { type Consistency, checkStated, type StatedDischarge } from "./consistency.ts";
export { type Crowbar, crowbarOf } from "./crowbar.ts";
export { chargerRipple, constantPowerSeconds, type Drift, driftOf, steadyDroop, voltageAfter } from "./droop.ts";
export { type Corner, type Envelope, envelopeOf, type Figures, type LoopSpread, type Spread } from "./envelope.ts";
export { atHigh, type FaultBank, type FaultUnit, worstBefore } from "./faultBank.ts";
export { faultAction, leastFaultAction, unitShortLoop } from "./faultCurrents.ts";
export { type Fault, type FaultId, worstOfFault } from "./faultRow.ts";
export { faultTable } from "./faultTable.ts";
export { type Fuse, type FuseDuty, fuseFindings } from "./fuse.ts";
export { checkLamp, type Lamp, lampConstant, TORR } from "./lamp.ts";
export {
  alphaOf,
  type LampBrief,
  type LampCircuit,
  lampCircuit,
  type NormalPulse,
  normalLampPulse,
} from "./lampDrive.ts";
export { type BuiltLampCircuit, type LampFit, lampFit } from "./lampFit.ts";
export { EXPLOSION_PART, type Explosion, explosionOf, lampFindings } from "./lampLimits.ts";
export { type LifeCase, type LifeRatio, lifeRatio, type Stress } from "./life.ts";
export { type Circuit, type Clamp, checkCircuit, IDEAL_SWITCH, type Load, type Switch } from "./load.ts";
export { type Bounds, boundsOf, type PulseBank, pulseBankOf, unknownsOf } from "./loopMesh.ts";
export { actionToZeroOf, type Peaks, peakCurrentOf, peaksOf } from "./peaks.ts";
export { type QuickLayout, quickBankPeak, quickPeakFactor } from "./peakTable.ts";
export { type Discharge, type DischargeEnergy, dischargeOf } from "./pulse.ts";
export { type Duty, type Heating, heatingOf, highestRate, rateFindings } from "./rate.ts";
export { type RingBus, ringBus } from "./ringBus.ts";
export { checkLoop, dampingOf, dischargeAt, limitOf, type SeriesLoop } from "./rlc.ts";
export { type CurrentSample, checkSamples } from "./samples.ts";
export { type Isolation, isolationOf, type ShortCase, type ShortResult, shortedUnit } from "./shortedUnit.ts";
export { reversalBound } from "./shotFindings.ts";
export { pulseFrequency, RESISTIVITY, skinDepth } from "./skin.ts";
export { type TraceRow, traceOf } from "./trace.ts";
export {
  type Arrangement,
  type PulseUnit,
  type UnitDuty,
  type UnitRatings,
  unitDutyOf,
  unitFindings,
  worstShare,
  worstSlew,
} from "./unitDuty.ts";
export { atLeast, atMost, type Bound, type Claim, remark } from "./verdict.ts";
export { widthOf } from "./width.ts";
