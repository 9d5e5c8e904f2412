import type { Evaluation } from '../../physics/results.js';
import { settingLabel } from '../../physics/setting.js';
import { shown } from './numbers.js';
import { plainTableText } from './plain-table.js';
import { quantityOf, quantitySections } from './weigh-quantities.js';

/**
 * Every technique at one size: the quantities, then what happens in each layer.
 *
 * @param detail the detail in words, since an SdNR is that of one detail and no other.
 */
export const sizeTables = (
  evaluations: readonly Evaluation[],
  detail: string,
): readonly string[] => [quantityTable(evaluations, detail), layerTable(evaluations)];

const quantityTable = (evaluations: readonly Evaluation[], detail: string): string => {
  const [{ size, thickness_mm }] = evaluations;
  const settings = evaluations.map(
    ({ setting }) => `${settingLabel(setting)}, grid ${setting.grid}`,
  );
  const rows = quantitySections.flatMap(({ heading, quantities }) => {
    const lines = quantities.map((quantity) => ({
      quantity,
      values: evaluations.map((evaluation) => quantityOf(quantity, evaluation)),
    }));
    if (lines.every(({ values }) => values.every((value) => value === null))) return [];
    return [
      [heading],
      ...lines.map(({ quantity, values }) => [
        `  ${quantity.path === 'sdnr' ? `SdNR of the ${detail}` : quantity.name}`,
        quantity.unit,
        ...values.map((value) => shown(value)),
      ]),
    ];
  });
  return plainTableText({
    title: `Size ${size}, ${shown(thickness_mm, 3)} mm`,
    headings: ['quantity', 'unit', ...evaluations.map(({ technique }) => technique)],
    rows: [['setting', '', ...settings], ...rows],
    wordColumns: 2,
  });
};

const layerTable = (evaluations: readonly Evaluation[]): string =>
  plainTableText({
    title: `Layers at size ${evaluations[0].size}`,
    headings: [
      'technique',
      'layer',
      'own transmission',
      'from the skin',
      'mean energy keV',
      'absorbed dose mGy',
    ],
    rows: evaluations.flatMap(({ technique, transmission, dose }) =>
      transmission.layers.map((layer, index) => [
        index === 0 ? technique : '',
        layer.layer,
        shown(layer.own),
        shown(layer.cumulative),
        shown(layer.meanEnergy_keV),
        shown(dose.layerAbsorbedDose_mGy?.[index].value),
      ]),
    ),
    wordColumns: 2,
  });
