import { describe, expect, test } from 'vitest';
import { findingsShown } from '../../../components/desk/page/findings-shown.js';
import type { Finding, Weighing } from '../../../physics/results.js';
import { sampleModel } from '../sample/model.js';
import { sampleWeighing } from '../sample/weighing.js';

const say = (message: string, more: Partial<Finding> = {}): Finding => ({
  code: 'x',
  severity: 'limit',
  message,
  ...more,
});
const weighing = (findings: Finding[]): Weighing => ({
  ...sampleWeighing,
  evaluations: [],
  comparisons: [],
  findings,
});
const messages = (model: typeof sampleModel) => findingsShown(model).map(({ message }) => message);

describe('the findings in the margin', () => {
  test('are those of the case and of the techniques shown', () => {
    const model = {
      ...sampleModel,
      weighing: weighing([
        say('of the case'),
        say('of Current', { technique: 'Current' }),
        say('of a third', { technique: 'Third' }),
      ]),
    };
    expect(messages(model)).toEqual(['of the case', 'of Current']);
  });

  test('hold what forbids at other sizes, and nothing less pressing from there', () => {
    const large = { technique: 'Current', size: 'large' };
    const other = weighing([
      say('has no place', large),
      say('a note', { ...large, severity: 'note' }),
      say('of a third', { technique: 'Third', size: 'large' }),
    ]);
    const model = { ...sampleModel, weighing: weighing([]), others: [other] };
    expect(messages(model)).toEqual(['has no place']);
  });

  test('are none before the first answer', () => {
    expect(findingsShown({ ...sampleModel, weighing: null })).toEqual([]);
  });
});
