import { describe, expect, test } from 'vitest';
import { mergedFindings } from '../../components/charts/merged-findings.js';
import type { Finding } from '../../physics/results.js';

const finding = (message: string, severity: Finding['severity'] = 'caution'): Finding => ({
  code: 'x',
  severity,
  message,
});
const names = ['Current', 'Proposed'];
const messages = (...findings: Finding[]) =>
  mergedFindings(findings, names).map(({ message }) => message);

describe('findings said once', () => {
  test('what is said of two techniques alike is one sentence naming both', () => {
    expect(messages(finding('Current: not modelled.'), finding('Proposed: not modelled.'))).toEqual(
      ['Current, Proposed: not modelled.'],
    );
  });

  test('repetitions go', () => {
    expect(messages(finding('Layers are infinite.'), finding('Layers are infinite.'))).toEqual([
      'Layers are infinite.',
    ]);
  });

  test('sentences with other figures stay apart', () => {
    expect(
      messages(finding('Current: needs 96 kW.'), finding('Proposed: needs 160 kW.')),
    ).toHaveLength(2);
  });

  test('a limit and a note are never one', () => {
    expect(
      messages(finding('Current: same.', 'limit'), finding('Proposed: same.', 'note')),
    ).toHaveLength(2);
  });
});
