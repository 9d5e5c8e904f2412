import {
  elementByZ,
  type KShell,
  kShell,
  type Material,
  namedMaterial,
  partialCoefficientsOn,
} from '../../materials/index.js';
import { nodeEnergies_keV, tableStride } from './energy-nodes.js';
import { nextUniform, type RandomStream } from './random.js';

/** K photons of lighter elements are absorbed within a fraction of a millimetre. */
export const leastFluorescentZ = 30;

/**
 * What photoelectric events may emit. Material m has emitters `firstEmitter[m]` to
 * `firstEmitter[m + 1]`. For emitter e at energy node n, `emission[e · stride + n]` is the
 * probability that it, or an earlier emitter of the material, emits a K photon:
 * Σ w τ_Z/τ · (1 − 1/J) · ω above the edge, 0 below. Emitter e has the lines `firstLine[e]` to
 * `firstLine[e + 1]`, with cumulative shares.
 */
export interface FluorescenceTables {
  readonly firstEmitter: Int32Array;
  readonly emission: Float32Array;
  readonly firstLine: Int32Array;
  readonly lineEnergies_keV: Float64Array;
  readonly lineCumulative: Float64Array;
}

interface Emitter {
  readonly z: number;
  readonly massFraction: number;
  readonly shell: KShell;
}

/** K fluorescence of the elements from zinc upward; no emitters at all when not `enabled`. */
export function fluorescenceTables(
  materials: readonly Material[],
  enabled: boolean,
): FluorescenceTables {
  const emitters = materials.map((material) => (enabled ? emittersOf(material) : []));
  const all = emitters.flat();
  const lines = all.flatMap(({ shell }) => shell.lines);
  const lineCumulative = all.flatMap(({ shell }) => runningSum(shell.lines.map((l) => l.share)));
  const emission = emitters.flatMap((list, m) => emissionOf(materials[m], list));
  return {
    firstEmitter: starts(emitters.map((list) => list.length)),
    emission: concatenated(emission),
    firstLine: starts(all.map(({ shell }) => shell.lines.length)),
    lineEnergies_keV: Float64Array.from(lines, ({ energy_keV }) => energy_keV),
    lineCumulative: Float64Array.from(lineCumulative),
  };
}

/**
 * Energy of the K photon that follows a photoelectric event in material `matter` at energy node
 * `node` + `between`; 0 when none is emitted.
 */
export function fluorescenceEnergy(
  tables: FluorescenceTables,
  matter: number,
  node: number,
  between: number,
  stream: RandomStream,
): number {
  const { emission, firstEmitter, firstLine, lineCumulative, lineEnergies_keV } = tables;
  const draw = nextUniform(stream);
  for (let e = firstEmitter[matter]; e < firstEmitter[matter + 1]; e++) {
    const at = e * tableStride + node;
    if (draw >= emission[at] + between * (emission[at + 1] - emission[at])) continue;
    const pick = nextUniform(stream);
    let line = firstLine[e];
    while (line < firstLine[e + 1] - 1 && pick >= lineCumulative[line]) line++;
    return lineEnergies_keV[line];
  }
  return 0;
}

function emittersOf(material: Material): Emitter[] {
  return material.massFractions.flatMap(({ z, massFraction }) => {
    const shell = z >= leastFluorescentZ && massFraction > 0 ? kShell(z) : undefined;
    return shell ? [{ z, massFraction, shell }] : [];
  });
}

function emissionOf(material: Material, emitters: readonly Emitter[]): Float32Array[] {
  const whole = photoelectric(material);
  const running = new Float64Array(tableStride);
  return emitters.map(({ z, massFraction, shell }) => {
    const own = photoelectric(element(z));
    const emitted = massFraction * shell.yield * (1 - 1 / shell.jumpRatio);
    for (let n = 0; n < tableStride; n++) {
      if (nodeEnergies_keV[n] >= shell.edge_keV) running[n] += (emitted * own[n]) / whole[n];
    }
    return Float32Array.from(running);
  });
}

const photoelectric = (material: Material): Float64Array =>
  partialCoefficientsOn(material, nodeEnergies_keV).photoelectric;

function element(z: number): Material {
  const { name } = elementByZ(z);
  const material = namedMaterial(name);
  if (!material) throw new Error(`${name}: no material of this name`);
  return material;
}

function starts(counts: readonly number[]): Int32Array {
  return Int32Array.from([0, ...runningSum(counts)]);
}

function runningSum(values: readonly number[]): number[] {
  let sum = 0;
  return values.map((value) => {
    sum += value;
    return sum;
  });
}

function concatenated(tables: readonly Float32Array[]): Float32Array {
  const all = new Float32Array(tables.length * tableStride);
  tables.forEach((table, i) => {
    all.set(table, i * tableStride);
  });
  return all;
}
