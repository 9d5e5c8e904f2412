import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { describe, expect, it } from 'vitest';
import { caseHash, parseCase } from '../../../physics/case/index.js';
import { type Loose, soundCase } from './broken-cases.js';

const hashOf = (json: unknown, files?: Record<string, string>): string => {
  const result = parseCase(json, files);
  if ('faults' in result) throw new Error(JSON.stringify(result.faults));
  return caseHash(result.case);
};

const changed = (change: (c: Loose) => void): string => {
  const c = soundCase();
  change(c);
  return hashOf(c);
};

describe('the hash of a case', () => {
  it('is the SHA-256 of canonical JSON without defaults and prose', () => {
    const json = {
      version: 1,
      format: 'stratabeam.case',
      title: 'prose is left out',
      room: { name: 'Room', tube: { anodeAngle_deg: 12 } },
      patient: { layers: [{ thickness_mm: 200, material: 'water', name: 'body' }] },
      task: { detail: { shape: 'slab', inLayer: 'body', size_mm: 5.0, material: 'pmma' } },
      techniques: [{ name: 'Current', control: { tubeLoad_mAs: 10 }, potential_kV: 80 }],
    };
    const canonical =
      '{"format":"stratabeam.case",' +
      '"patient":{"layers":[{"material":"water","name":"body","thickness_mm":200}]},' +
      '"task":{"detail":{"inLayer":"body","material":"pmma","shape":"slab","size_mm":5}},' +
      '"techniques":[{"control":{"tubeLoad_mAs":10},"name":"Current","potential_kV":80}],' +
      '"version":1}';
    expect(hashOf(json)).toBe(bytesToHex(sha256(utf8ToBytes(canonical))));
  });

  it('stays as it was in version 1 for the worked example', () => {
    expect(hashOf(soundCase())).toBe(
      '9dadb57528271154c927de6d643d18908680d1f7f791650b846e3e716e3c3cbd',
    );
  });

  it('does not change with the order of keys, prose, or defaults written out', () => {
    const original = hashOf(soundCase());
    expect(hashOf(Object.fromEntries(Object.entries(soundCase()).reverse()))).toBe(original);
    expect(
      changed((c) => {
        c.title = 'another title';
        c.question = 'another question?';
        c.dossier.text = { summary: 'words' };
      }),
    ).toBe(original);
    expect(changed((c) => delete c.room.tube.anodeAngle_deg)).toBe(original);
    expect(changed((c) => delete c.compare)).toBe(original);
    expect(changed((c) => (c.room.tube.rating = []))).toBe(original);
    expect(changed((c) => delete c.techniques[0].acquisition.maskFrames)).toBe(original);
  });

  it('holds the formula of a material, not the atomic weights behind it', () => {
    const material = { name: 'my salt', density_g_per_cm3: 2.17, formula: 'NaCl' };
    const byFormula = changed((c) => (c.materials = [material]));
    const parsedAgain = parseCase({ ...soundCase(), materials: [material] });
    if ('faults' in parsedAgain) throw new Error('refused');
    expect(Object.keys(parsedAgain.case.materials[0].massFractions)).toEqual(['Na', 'Cl']);
    expect(hashOf(parsedAgain.case)).toBe(byFormula);
  });

  it('changes with anything that changes a result', () => {
    const original = hashOf(soundCase());
    expect(changed((c) => (c.room.tube.anodeAngle_deg = 11))).not.toBe(original);
    expect(changed((c) => (c.patient.layers[1].thickness_mm = 170.001))).not.toBe(original);
    expect(changed((c) => c.techniques.reverse())).not.toBe(original);
  });

  it('depends on the rows of a size file, not on its name', () => {
    const sizes = (file: string) => ({ ...soundCase().patient, sizes: { file } });
    const rows = 'thickness_mm,weight\n180,1\n220,2\n';
    const a = hashOf({ ...soundCase(), patient: sizes('a.csv') }, { 'a.csv': rows });
    const b = hashOf({ ...soundCase(), patient: sizes('b.csv') }, { 'b.csv': rows });
    const c = hashOf({ ...soundCase(), patient: sizes('b.csv') }, { 'b.csv': `${rows}240,1\n` });
    expect(a).toBe(b);
    expect(c).not.toBe(a);
  });
});
