import { describe, expect, it } from 'vitest';
import { jsonOf, runCommand } from './run-command.js';

interface BeamAnswer {
  readonly potential_kV: number;
  readonly halfValueLayers: readonly {
    readonly material: string;
    readonly first_mm: number;
    readonly second_mm: number;
    readonly tenth_mm: number;
  }[];
  readonly homogeneityCoefficient: number;
  readonly meanEnergy_keV: number;
  readonly airKerma_uGy_per_mAs: number;
  readonly fluence_per_mm2_per_mAs: number;
  readonly spectrum: readonly {
    readonly energy_keV: number;
    readonly fluence_per_mm2_per_keV_per_mAs: number;
    readonly from_keV: number;
    readonly to_keV: number;
  }[];
}

const beam = (...words: string[]): Promise<BeamAnswer> =>
  jsonOf(['beam', ...words]) as Promise<unknown> as Promise<BeamAnswer>;
const reference = ['--potential', '80', '--through', 'aluminium 2.5 mm', '--output-factor', '1'];

describe('stratabeam beam', () => {
  it('gives the reference beam of 80 kV, 12°, 2.5 mm Al within 0.3 % and 0.5 % (tube model, separate evaluation)', async () => {
    const answer = await beam(...reference);
    const [aluminium, copper] = answer.halfValueLayers;
    expect(aluminium.material).toBe('aluminium');
    expect(copper.material).toBe('copper');
    expect(Math.abs(aluminium.first_mm / 2.7275 - 1)).toBeLessThan(0.003);
    expect(Math.abs(aluminium.second_mm / 4.082 - 1)).toBeLessThan(0.003);
    expect(Math.abs(answer.meanEnergy_keV / 43.005 - 1)).toBeLessThan(0.003);
    expect(Math.abs(answer.airKerma_uGy_per_mAs / 82.445 - 1)).toBeLessThan(0.005);
    expect(Math.abs(answer.fluence_per_mm2_per_mAs / 1.5182e6 - 1)).toBeLessThan(0.005);
  });

  it('gives a spectrum whose bins hold every photon, K lines included', async () => {
    const answer = await beam('--potential', '100', '--through', 'aluminium 3 mm');
    const photons = answer.spectrum.reduce(
      (sum, row) => sum + row.fluence_per_mm2_per_keV_per_mAs * (row.to_keV - row.from_keV),
      0,
    );
    expect(photons / answer.fluence_per_mm2_per_mAs).toBeCloseTo(1, 12);
    const at = (energy: number) =>
      answer.spectrum.find((row) => row.from_keV <= energy && energy < row.to_keV)
        ?.fluence_per_mm2_per_keV_per_mAs ?? 0;
    expect(at(59.318)).toBeGreaterThan(3 * at(62));
  });

  it('follows the inverse square in vacuum and loses more in air', async () => {
    const near = await beam(...reference);
    const far = await beam(...reference, '--distance', '2000');
    const inAir = await beam(...reference, '--distance', '2000', '--air');
    expect(far.airKerma_uGy_per_mAs / near.airKerma_uGy_per_mAs).toBeCloseTo(0.25, 12);
    expect(inAir.airKerma_uGy_per_mAs).toBeLessThan(far.airKerma_uGy_per_mAs);
    expect(inAir.halfValueLayers[0].first_mm).toBeGreaterThan(far.halfValueLayers[0].first_mm);
  });

  it('scales its output with potential by the exponent, anchored at 80 kV', async () => {
    const at = async (kV: string, ...more: string[]) =>
      (await beam('--potential', kV, '--through', 'aluminium 3 mm', ...more)).airKerma_uGy_per_mAs;
    const exponent = ['--output-exponent', '-0.2'];
    expect((await at('80', ...exponent)) / (await at('80'))).toBeCloseTo(1, 12);
    expect((await at('120', ...exponent)) / (await at('120'))).toBeCloseTo(1.5 ** -0.2, 12);
    const { out } = await runCommand(['beam', ...reference, ...exponent]);
    expect(out).toMatch(/, output factor 1 × \(kV\/80\)\^-0\.2\n/);
  });

  it('takes layers in any order, once or several times named', async () => {
    const one = await beam('--potential', '70', '--through', 'aluminium 2.5 mm', 'copper 0.2 mm');
    const two = await beam(
      '--potential',
      '70',
      '--through',
      'Cu 200 um',
      '--through',
      'Al 0.25 cm',
    );
    expect(two.airKerma_uGy_per_mAs / one.airKerma_uGy_per_mAs).toBeCloseTo(1, 12);
  });

  it('takes a formula with its density', async () => {
    const named = await beam(...reference, '--through', 'barium sulfate 0.1 mm');
    const formula = await beam(...reference, '--through', 'BaSO4 4.5 g/cm3 0,1 mm');
    expect(formula.airKerma_uGy_per_mAs).toBeCloseTo(named.airKerma_uGy_per_mAs, 9);
  });

  it('shows people a table and programs a CSV spectrum that a case can read', async () => {
    const table = await runCommand(['beam', ...reference]);
    expect(table.out).toMatch(
      /^80 kV, anode 12°, through aluminium 2.5 mm, vacuum, at 1000 mm, output factor 1\n/,
    );
    expect(table.out).toMatch(/aluminium +2\.728 +4\.081/);
    const csv = await runCommand(['beam', ...reference, '--csv']);
    expect(csv.out.split('\n')[0]).toBe('energy_keV,fluence_per_mm2_per_keV_per_mAs');
  });

  it.each([
    [
      ['--potential', '160'],
      '--potential: "160": must be a number, 20 to 150; enter the tube potential in kV',
    ],
    [
      ['--potential', '1e999'],
      '--potential: "1e999": must be a number, 20 to 150; enter the tube potential in kV',
    ],
    [
      ['--potential', '0x50'],
      '--potential: "0x50": must be a number, 20 to 150; enter the tube potential in kV',
    ],
    [
      ['--potential', '80', '--anode-angle', '95'],
      '--anode-angle: "95": must be a number, 6 to 22; enter the nameplate angle',
    ],
    [
      ['--potential', '80'],
      '--through: nothing, 0 mm Al in all: must be at least 1 mm aluminium equivalent; list all that lies between anode and point, as in --through "aluminium 2.5 mm"',
    ],
    [
      ['--potential', '80', '--through', 'aluminium'],
      '--through: "aluminium": must be a material and a thickness with its unit; write it as "aluminium 2.5 mm"',
    ],
    [
      ['--potential', '80', '--through', 'aluminun 2 mm'],
      '--through: "aluminun": must be a known material; did you mean "aluminium"?',
    ],
    [
      ['--potential', '80', '--through', 'CsI 2 mm', 'XyZ 1 mm'],
      '--through: "XyZ": has "Xy" at place 1, which is no element from H to U; write symbols with their usual capitals, as in BaSO4',
    ],
  ])('refuses %j in one line', async (words, line) => {
    const { code, out, err } = await runCommand(['beam', ...words]);
    expect({ code, out, err }).toEqual({ code: 2, out: '', err: `${line}\n` });
  });
});
