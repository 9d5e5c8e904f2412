import { describe, expect, it } from 'vitest';
import { jsonOf, runCommand } from './run-command.js';

interface MatterAnswer {
  readonly name: string;
  readonly density_g_per_cm3: number;
  readonly electronDensity_per_cm3: number;
  readonly rows: readonly Readonly<Record<string, number | null>>[];
  readonly findings: readonly { readonly code: string }[];
}

const matter = (...words: string[]): Promise<MatterAnswer> =>
  jsonOf(['matter', ...words]) as Promise<unknown> as Promise<MatterAnswer>;

describe('stratabeam matter', () => {
  it('gives water at 60 keV as NISTIR 5632 prints it: μ/ρ 0.2059, μen/ρ 0.03190 cm²/g', async () => {
    const { rows, density_g_per_cm3 } = await matter('water', '--energy', '60');
    const [row] = rows;
    expect(Math.abs(Number(row.massAttenuation_cm2_per_g) / 0.2059 - 1)).toBeLessThan(0.003);
    expect(Math.abs(Number(row.massEnergyAbsorption_cm2_per_g) / 0.0319 - 1)).toBeLessThan(0.003);
    expect(density_g_per_cm3).toBe(1);
  });

  it('gives parts that sum to the whole and lengths that follow from it', async () => {
    const { rows, density_g_per_cm3 } = await matter('lead', '--energy', '50', '1500');
    for (const row of rows) {
      const sum =
        Number(row.coherent_cm2_per_g) +
        Number(row.incoherent_cm2_per_g) +
        Number(row.photoelectric_cm2_per_g) +
        Number(row.pair_cm2_per_g);
      expect(sum / Number(row.massAttenuation_cm2_per_g)).toBeCloseTo(1, 12);
      const mu = Number(row.massAttenuation_cm2_per_g) * density_g_per_cm3;
      expect(row.linearAttenuation_per_cm).toBeCloseTo(mu, 12);
      expect(row.halfValue_mm).toBeCloseTo((10 * Math.LN2) / mu, 12);
      expect(row.tenthValue_mm).toBeCloseTo((10 * Math.LN10) / mu, 12);
    }
    expect(rows[0].pair_cm2_per_g).toBe(0);
    expect(rows[1].pair_cm2_per_g).toBeGreaterThan(0);
  });

  it('knows elements by symbol and name, formulas by density', async () => {
    const [byName, bySymbol] = [await matter('copper'), await matter('Cu')];
    expect(bySymbol).toEqual(byName);
    const { rows } = await matter('CsI', '--density', '4.51', '--energy', '60');
    const [named] = (await matter('caesium iodide', '--energy', '60')).rows;
    expect(rows[0].linearAttenuation_per_cm).toBeCloseTo(Number(named.linearAttenuation_per_cm), 9);
  });

  it('lets a density replace the usual one of a named material', async () => {
    const { density_g_per_cm3 } = await matter('lung', '--density', '0.3');
    expect(density_g_per_cm3).toBe(0.3);
  });

  it('gives null for energy absorption above 3 MeV, and says where it is too high', async () => {
    const { rows, findings } = await matter('lead', '--energy', '100', '200', '5000');
    expect(rows[2].massEnergyAbsorption_cm2_per_g).toBeNull();
    expect(findings.map(({ code }) => code)).toEqual(['energyAbsorption', 'energyAbsorption']);
    const { out } = await runCommand(['matter', 'lead', '--energy', '200']);
    expect(out).toMatch(/caution: lead: μen\/ρ at 200 keV neglects bremsstrahlung/);
  });

  it('lists its CSV with the units in the headings', async () => {
    const { out } = await runCommand(['matter', 'water', '--energy', '60', '--csv']);
    const [heading, row] = out.split('\n');
    expect(heading).toMatch(/^energy_keV,coherent_cm2_per_g,.*,tenthValue_mm$/);
    expect(row).toMatch(/^60,/);
  });

  it.each([
    [['soft'], 'NAME: "soft": must be a known material; did you mean "soft tissue"?'],
    [
      ['BaSO4'],
      'NAME: "BaSO4": must come with a density when it is a formula; add --density in g/cm³',
    ],
    [
      ['water', '--energy', '0.5'],
      '--energy: "0.5": must be a number, 1 to 20000; enter the photon energy in keV',
    ],
    [
      ['water', '--density', '-1'],
      '--density: "-1": must be a number, 0.000001 to 30; enter the density in g/cm³',
    ],
    [[], 'NAME: missing: must be given; see --help'],
  ])('refuses %j in one line', async (words, line) => {
    const { code, out, err } = await runCommand(['matter', ...words]);
    expect({ code, out, err }).toEqual({ code: 2, out: '', err: `${line}\n` });
  });
});
