/*
 * A shot through a lamp, a clamp or both, by the integrator, in SI.
 *
 * The mesh is put into numbers of one (see meshSlopes.ts), followed to its end, and put back. Every energy is an integral of
 * its own (R times the action, K0 times the integral of |i|^1.5, the drop times the charge), so that their sum agreeing with
 * the stored energy is a check and not a definition. Needs some inductance; noInductanceShot takes the mesh without.
 * Source: [ME1966] lamp mesh; [methods-derived] the clamp.
 */
import { accepted, power, type Read, refused } from "../quantity/index.ts";
import { within } from "./dormandPrince.ts";
import { courseOf, type MeshCourse } from "./meshCourse.ts";
import * as eq from "./meshSlopes.ts";
import { inductanceOf, type Mesh, resistanceOf, type Shot, storedIn } from "./shot.ts";

/** Error allowed per step, relative: keeps the energies' sum within 1e-9 of the stored energy. */
export const FINE = 1e-11;

/** A bank with less of the mesh's inductance than this is taken to have it outside: figures err by no more than this part. */
const LEAST_BANK_COIL = 1e-7;

/** The mesh in numbers of one. */
export function normalMesh(mesh: Mesh): eq.NormalMesh {
  const inductance = inductanceOf(mesh);
  const impedance = Math.sqrt(inductance / mesh.capacitance);
  const bankR = mesh.bank.resistance / impedance;
  const part = mesh.bank.inductance / inductance;
  const bankL = part < LEAST_BANK_COIL ? 0 : part;
  return {
    bankR,
    bankL,
    outerR: (resistanceOf(mesh) - mesh.bank.resistance) / impedance,
    outerL: bankL === 0 ? 1 : (mesh.bus.inductance + mesh.load.inductance) / inductance,
    lamp: mesh.lampConstant / Math.sqrt(mesh.voltage * impedance),
    drop: mesh.switch.drop / mesh.voltage,
    clampDrop: mesh.clamp === null ? null : mesh.clamp.drop / mesh.voltage,
    clampR: mesh.clamp === null ? 0 : mesh.clamp.resistance / impedance,
  };
}

/** State at a time in numbers of one: finds the piece by halving, then the part of it by halving again. */
function finder(course: MeshCourse): (time: number) => Float64Array {
  const pieces = course.stages.flatMap((stage) => stage.pieces);
  const out = new Float64Array(eq.STATES);
  return (time) => {
    if (time >= course.end[eq.TIME]! || pieces.length === 0) return course.end;
    let [low, high] = [0, pieces.length];
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (pieces[middle]!.rows[eq.TIME]! <= time) low = middle;
      else high = middle;
    }
    const piece = pieces[low]!;
    let [from, to] = [0, 1];
    for (let turn = 0; turn < 50; turn++) {
      const part = (from + to) / 2;
      if (within(piece, part, out)[eq.TIME]! <= time) from = part;
      else to = part;
    }
    return within(piece, from, out);
  };
}

/**
 * The shot of a mesh with inductance. Refused: a charge voltage not above the switch drop (pulse.drop), a mesh without
 * inductance (pulse.loop.none), and one so stiff or so long-ringing that the step limit cut it short (pulse.stiff).
 */
export function meshShot(mesh: Mesh, tolerance: number = FINE): Read<Shot> {
  const place = { field: "voltage" };
  if (!(mesh.voltage > mesh.switch.drop)) {
    const want = `a charge voltage above the switch drop of ${mesh.switch.drop} V`;
    return refused({ code: "pulse.drop", place, read: `${mesh.voltage} V`, want });
  }
  const inductance = inductanceOf(mesh);
  if (!(inductance > 0)) {
    return refused({ code: "pulse.loop.none", place: { field: "inductance" }, read: "0 H", want: "some inductance" });
  }
  const normal = normalMesh(mesh);
  const course = courseOf(normal, mesh.switch.oneWay, tolerance);
  if (!course.whole) {
    const want = "a mesh whose L/R is not so much shorter than its RC, or no inductance at all";
    return refused({ code: "pulse.stiff", place: { field: "inductance" }, read: `${inductance} H`, want });
  }
  const impedance = Math.sqrt(inductance / mesh.capacitance);
  const current = mesh.voltage / impedance;
  const time = Math.sqrt(inductance * mesh.capacitance);
  const { end } = course;
  const action = end[eq.ACTION]! * current * current * time;
  const bankAction = end[eq.BANK_ACTION]! * current * current * time;
  const charge = end[eq.CHARGE]! * current * time;
  const lampIntegral = end[eq.LAMP]! * power(current, 1.5) * time;
  const clampHeat =
    (mesh.clamp?.drop ?? 0) * end[eq.CLAMP_CHARGE]! * current * time +
    (mesh.clamp?.resistance ?? 0) * end[eq.CLAMP_ACTION]! * current * current * time;
  const loadEnd = power(end[eq.ROOT]!, 4);
  const bankEnd = course.clamped && normal.bankL > 0 ? end[eq.BANK_CURRENT]! ** 2 : loadEnd;
  const coil = normal.bankL * bankEnd + normal.outerL * loadEnd;
  const stored = storedIn(mesh);
  const find = finder(course);
  return accepted({
    method: "integrator",
    peakCurrent: course.peak.current * current,
    peakTime: course.peak.time * time,
    reversal: Math.max(0, -course.lowest),
    action,
    bankAction,
    energy: {
      stored,
      load: mesh.load.resistance * action + mesh.lampConstant * lampIntegral,
      bank: mesh.bank.resistance * bankAction,
      bus: mesh.bus.resistance * action,
      switch: mesh.switch.resistance * action + mesh.switch.drop * charge,
      clamp: clampHeat,
      left: stored * (end[eq.VOLTAGE]! ** 2 + coil),
    },
    duration: end[eq.TIME]! * time,
    at: (moment) => {
      const y = find(moment / time);
      const over = moment / time > end[eq.TIME]!;
      return {
        current: over ? 0 : y[eq.ROOT]! * Math.abs(y[eq.ROOT]!) * current,
        voltage: y[eq.VOLTAGE]! * mesh.voltage,
      };
    },
  });
}
