import { csvText } from '../../physics/csv/csv-text.js';
import type { Weighing } from '../../physics/results.js';
import { quantityOf, quantitySections } from './weigh-quantities.js';

const quantities = quantitySections.flatMap((section) => section.quantities);

/** One line per technique and size, every quantity of the tables at full precision. */
export const weighCsv = ({ evaluations }: Weighing): string =>
  csvText(
    [
      'technique',
      'size',
      'thickness_mm',
      'setting.potential_kV',
      'setting.filter',
      'setting.grid',
      ...quantities.map(({ path }) => path),
      'limits',
    ],
    evaluations.map((evaluation) => [
      evaluation.technique,
      evaluation.size,
      evaluation.thickness_mm,
      evaluation.setting.potential_kV,
      evaluation.setting.filter,
      evaluation.setting.grid,
      ...quantities.map((quantity) => quantityOf(quantity, evaluation)),
      evaluation.findings
        .filter(({ severity }) => severity === 'limit')
        .map(({ code }) => code)
        .join(' '),
    ]),
  );
