import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  type CheckRow,
  judge,
  photonsText,
  photonsToDecide,
  verdictText,
} from '../../../physics/check-by-transport/index.js';

const transport = (value: number, standardError: number | null) => ({ value, standardError });

describe('the verdict on an estimate', () => {
  it.each([
    // estimate, transport, standard error, verdict at a tolerance of 10 %
    [2.0, 2.0, 0.01, 'agrees'],
    [2.19, 2.0, 0.05, 'agrees'],
    [2.19, 2.0, 0.11, 'undecided'],
    [2.25, 2.0, 0.01, 'differs'],
    [2.25, 2.0, 0.05, 'undecided'],
    [1.7, 2.0, 0.02, 'differs'],
    [2.0, 2.0, null, 'undecided'],
    [0.1, 0, 0, 'undecided'],
  ])('%f beside %f ± %s: %s', (estimate, value, error, verdict) => {
    expect(judge(estimate, transport(value, error), 10).verdict).toBe(verdict);
  });

  it('gives the difference in percent of transport and in standard errors', () => {
    const { difference_percent, z } = judge(1.9, transport(2, 0.05), 10);
    expect(difference_percent).toBeCloseTo(-5, 12);
    expect(z).toBeCloseTo(-2, 12);
  });

  it('is never made while the standard error is larger than the tolerance', () => {
    const positive = fc.double({ min: 1e-3, max: 1e3, noNaN: true });
    const percent = fc.double({ min: 1, max: 20, noNaN: true });
    fc.assert(
      fc.property(positive, positive, percent, percent, (estimate, value, error, tolerance) => {
        fc.pre(error > tolerance);
        const judged = judge(estimate, transport(value, (value * error) / 100), tolerance);
        expect(judged.verdict).toBe('undecided');
      }),
    );
  });

  it('asks for as many photons as bring two standard errors into the tolerance', () => {
    const wanted = photonsToDecide(2.1, transport(2, 0.4), 10, 1000) ?? 0;
    expect(wanted).toBeCloseTo(16_000, 6);
    const then = 0.4 * Math.sqrt(1000 / wanted);
    expect(2 * then).toBeCloseTo(0.2, 12);
  });

  it('at the edge asks for as many photons as bring two standard errors into the excess', () => {
    const atEdge = transport(2, 0.02);
    expect(judge(2.23, atEdge, 10).verdict).toBe('undecided');
    const wanted = photonsToDecide(2.23, atEdge, 10, 9000) ?? 0;
    const then = transport(2, 0.02 * Math.sqrt(9000 / wanted) * 0.999);
    expect(wanted).toBeGreaterThan(9000);
    expect(judge(2.23, then, 10).verdict).toBe('differs');
    expect(photonsToDecide(2.2, transport(2, 0.02), 10, 9000)).not.toBe(0);
  });

  it('is told in plain words', () => {
    const row = (part: Partial<CheckRow>): CheckRow => ({
      quantity: 'spr',
      layer: null,
      name: 'Scatter to primary',
      unit: '',
      estimate: 2,
      transport: transport(2, 0.01),
      tolerance_percent: 10,
      difference_percent: 0,
      z: 0,
      verdict: 'agrees',
      photonsToDecide: 100,
      ...part,
    });
    expect(verdictText(row({}))).toBe('agrees within 10 %');
    expect(verdictText(row({ verdict: 'differs' }))).toBe('differs by more than 10 %');
    expect(
      verdictText(
        row({ verdict: 'undecided', transport: transport(2, 0.5), photonsToDecide: 2.43e6 }),
      ),
    ).toBe('not yet decided: needs 2.4 million photons');
    expect(verdictText(row({ verdict: 'undecided' }))).toBe(
      'not yet decided: at the edge of 10 %, needs 100 photons',
    );
    expect(verdictText(row({ verdict: null, tolerance_percent: null }))).toBe('transport alone');
  });

  it.each([
    [990, '990'],
    [999_600, '1 million'],
    [25_000, '25 thousand'],
    [1_000_000, '1 million'],
    [2.4e9, '2.4 billion'],
  ])('counts %i photons as %s', (photons, text) => {
    expect(photonsText(photons)).toBe(text);
  });
});
