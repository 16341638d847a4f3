// The shots against a general-purpose circuit simulator: fifty random circuits of five kinds, within 1e-5 of their peak.
// Needs no twin in src: it holds the closed forms and the integrator at once to something outside the project.
import { Simulation } from "eecircuit-engine";
import { beforeAll, describe, expect, test } from "vitest";
import { linearShot } from "../../src/pulse/linearShot.ts";
import { meshShot } from "../../src/pulse/meshShot.ts";
import { inductanceOf, type Mesh, resistanceOf } from "../../src/pulse/shot.ts";

type Kind = "ringing" | "near critical" | "overdamped" | "clamp" | "lamp";

/** Park and Miller's generator, so that every run sees the same circuits. */
function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 48271) % 2147483647;
    return state / 2147483647;
  };
}

/** Time scale of each batch [s]: circuits of one batch share a clock within 20 %, so that they can share a netlist. */
const SCALES = [2e-7, 5e-6, 1e-4, 1e-3, 2e-2] as const;
const KINDS: readonly Kind[] = ["ringing", "near critical", "overdamped", "clamp", "lamp"];
/** Steps of the simulator in one sqrt(LC): its error goes as the square of the step, some 1e-6 of peak over one turn here. */
const STEPS = 800;

/** A random mesh of a kind whose sqrt(LC) is `time` [s]. */
function circuit(kind: Kind, time: number, random: () => number): Mesh {
  const between = (low: number, high: number): number => low + (high - low) * random();
  const impedance = 10 ** between(-2.5, 1);
  const voltage = 10 ** between(1.5, 4);
  const side = random() < 0.5 ? -1 : 1;
  const damping = {
    ringing: between(0.05, 0.8),
    "near critical": 1 + side * 10 ** between(-9, -2),
    overdamped: between(1.05, 3),
    clamp: between(0.1, 0.6),
    lamp: 0,
  }[kind];
  const resistance = 2 * damping * impedance;
  const inside = between(0.2, 0.8);
  const coilInside = kind === "clamp" ? between(0.05, 0.4) : 0;
  const inductance = time * impedance;
  return {
    capacitance: time / impedance,
    voltage,
    bank: { resistance: resistance * inside, inductance: inductance * coilInside },
    bus: { resistance: 0, inductance: 0 },
    load: { resistance: resistance * (1 - inside), inductance: inductance * (1 - coilInside) },
    switch: { drop: 0, resistance: kind === "lamp" ? 0.1 * impedance * random() : 0, oneWay: false },
    lampConstant: kind === "lamp" ? between(0.5, 2) * Math.sqrt(voltage * impedance) : 0,
    clamp:
      kind === "clamp" ? { drop: voltage * between(0.001, 0.02), resistance: impedance * between(0.02, 0.1) } : null,
  };
}

/** The mesh as netlist lines; its load current is the current of its coil. */
function lines(mesh: Mesh, k: number): string {
  const { clamp } = mesh;
  const outer = resistanceOf(mesh) - mesh.bank.resistance;
  const out = [`C${k} a${k} 0 ${mesh.capacitance} IC=${mesh.voltage}`];
  if (mesh.bank.inductance > 0) out.push(`LB${k} a${k} m${k} ${mesh.bank.inductance} IC=0`);
  const from = mesh.bank.inductance > 0 ? `m${k}` : `a${k}`;
  out.push(mesh.bank.resistance > 0 ? `RB${k} ${from} t${k} ${mesh.bank.resistance}` : `VB${k} ${from} t${k} 0`);
  if (clamp !== null) {
    out.push(`BD${k} 0 t${k} I=v(t${k}) < ${-clamp.drop} ? (${-clamp.drop}-v(t${k}))/${clamp.resistance} : 0`);
  }
  out.push(`L${k} t${k} x${k} ${mesh.load.inductance} IC=0`, `VM${k} x${k} y${k} 0`);
  out.push(outer > 0 ? `R${k} y${k} z${k} ${outer}` : `VR${k} y${k} z${k} 0`);
  const i = `i(VM${k})`;
  const tiny = 1e-10 * mesh.voltage * Math.sqrt(mesh.capacitance / inductanceOf(mesh));
  out.push(
    mesh.lampConstant > 0 ? `BL${k} z${k} 0 V=${mesh.lampConstant}*${i}/sqrt(abs(${i})+${tiny})` : `VZ${k} z${k} 0 0`,
  );
  return out.join("\n");
}

interface Compared {
  readonly kind: Kind;
  /** Worst difference of the load current over its peak, and of the capacitor voltage over the charge voltage. */
  readonly current: number;
  readonly voltage: number;
  readonly points: number;
  readonly clampHeat: number;
}

/** Runs one batch in one netlist and compares every circuit at every time the simulator tells. */
async function compareBatch(simulation: Simulation, scale: number, random: () => number): Promise<readonly Compared[]> {
  const kinds = [...KINDS, ...KINDS];
  const meshes = kinds.map((kind) => circuit(kind, scale * (0.9 + 0.2 * random()), random));
  const step = scale / STEPS;
  const net = ["ten circuits", ...meshes.map(lines), ".options reltol=1e-6 abstol=1e-9 vntol=1e-9"];
  simulation.setNetList([...net, `.tran ${step} ${6 * scale} 0 ${step} uic`, ".end"].join("\n"));
  const result = await simulation.runSim();
  // a bad netlist does not reject, it only leaves its complaint here
  expect(simulation.getError()).toEqual([]);
  if (result.dataType !== "real") throw new Error("a transient has real data");
  const column = (name: string): readonly number[] => {
    const found = result.data.find((one) => one.name.toLowerCase() === name);
    if (found === undefined) throw new Error(`no ${name} among ${result.variableNames.join(" ")}`);
    return found.values;
  };
  const times = column("time");
  return meshes.map((mesh, k) => {
    const read = mesh.lampConstant > 0 || mesh.clamp !== null ? meshShot(mesh) : linearShot(mesh);
    if (!read.ok) throw new Error(read.refusals.map(({ code }) => code).join());
    const shot = read.value;
    const [currents, voltages] = [column(`i(vm${k})`), column(`v(a${k})`)];
    let [current, voltage, points] = [0, 0, 0];
    times.forEach((time, index) => {
      if (time > shot.duration) return;
      const state = shot.at(time);
      current = Math.max(current, Math.abs(currents[index]! - state.current));
      voltage = Math.max(voltage, Math.abs(voltages[index]! - state.voltage));
      points++;
    });
    return {
      kind: kinds[k]!,
      current: current / shot.peakCurrent,
      voltage: voltage / mesh.voltage,
      points,
      clampHeat: shot.energy.clamp,
    };
  });
}

describe("shots against a general-purpose circuit simulator", () => {
  const compared: Compared[] = [];

  beforeAll(async () => {
    const simulation = new Simulation();
    await simulation.start();
    const random = seeded(20240607);
    for (const scale of SCALES) compared.push(...(await compareBatch(simulation, scale, random)));
  }, 60_000);

  test("fifty circuits were compared, each at a thousand points or more", () => {
    expect(compared).toHaveLength(50);
    expect(Math.min(...compared.map(({ points }) => points))).toBeGreaterThan(1000);
  });

  for (const kind of KINDS) {
    test(`${kind}: ten circuits, all of current and voltage within 1e-5 of the peak`, () => {
      const own = compared.filter((one) => one.kind === kind);
      expect(own).toHaveLength(10);
      expect(Math.max(...own.map((one) => one.current))).toBeLessThan(1e-5);
      expect(Math.max(...own.map((one) => one.voltage))).toBeLessThan(1e-5);
    });
  }

  test("every clamp conducted, so that the clamped stage was compared and not passed by", () => {
    expect(compared.filter(({ kind, clampHeat }) => kind === "clamp" && !(clampHeat > 0))).toEqual([]);
  });
});
