import { describe, expect, test } from 'vitest';
import { mergedFindings } from '../../components/charts/merged-findings.js';
import type { Finding } from '../../physics/results.js';

const finding = (
  technique: string | undefined,
  message: string,
  size?: string,
  severity: Finding['severity'] = 'caution',
): Finding => ({ code: 'x', severity, technique, size, message });

const messages = (...findings: Finding[]) =>
  mergedFindings(findings, 'median').map(({ message }) => message);

describe('findings said once', () => {
  test('what is said of two techniques alike is one sentence naming both', () => {
    expect(
      messages(finding('Current', 'Not modelled.'), finding('Proposed', 'Not modelled.')),
    ).toEqual(['Current, Proposed: Not modelled.']);
  });

  test('names that hold commas are told apart by semicolons', () => {
    expect(messages(finding('Current', 'Same.'), finding('Proposed, heavier', 'Same.'))).toEqual([
      'Current; Proposed, heavier: Same.',
    ]);
  });

  test('what is said of no technique stands by itself, once', () => {
    const said = finding(undefined, 'Layers are infinite.');
    expect(messages(said, said)).toEqual(['Layers are infinite.']);
  });

  test('the size looked at is not named, another is', () => {
    expect(
      messages(
        finding('Current', 'Needs 96 kW.', 'median'),
        finding('Current', 'Needs 160 kW.', 'large'),
      ),
    ).toEqual(['Current: Needs 96 kW.', 'Current, size large: Needs 160 kW.']);
  });

  test('several other sizes stand in one sentence, none beside the one looked at', () => {
    expect(
      messages(finding('Current', 'Same.', 'small'), finding('Current', 'Same.', 'large')),
    ).toEqual(['Current, sizes small and large: Same.']);
    expect(
      messages(finding('Current', 'Same.', 'large'), finding('Current', 'Same.', 'median')),
    ).toEqual(['Current: Same.']);
  });

  test('a technique named in its own message is still said whose it is', () => {
    expect(messages(finding('set', 'As set the saving looks larger.'))).toEqual([
      'set: As set the saving looks larger.',
    ]);
  });

  test('sentences with other figures stay apart', () => {
    expect(
      messages(finding('Current', 'Needs 96 kW.'), finding('Proposed', 'Needs 160 kW.')),
    ).toHaveLength(2);
  });

  test('a limit and a note are never one', () => {
    expect(
      messages(
        finding('Current', 'Same.', undefined, 'limit'),
        finding('Proposed', 'Same.', undefined, 'note'),
      ),
    ).toHaveLength(2);
  });
});
