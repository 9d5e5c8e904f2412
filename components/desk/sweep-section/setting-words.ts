import { settingLabel } from '../../../physics/setting.js';
import { type CostName, costs, figureOfMerit } from '../../../physics/sweep/costs.js';
import type { SweepSetting } from '../../../physics/sweep/sweep-setting.js';
import { formatNumber, formatPercent } from '../../charts/format.js';

/** A setting read off the map, in words: what it gives, what it costs, what forbids it. */
export function settingWords(
  setting: SweepSetting,
  cost: CostName,
  best: number | null,
): { readonly name: string; readonly values: string; readonly limits: string } {
  const { values, findings } = setting;
  const name = settingLabel(setting);
  const broken = findings.filter(({ severity }) => severity === 'limit');
  const nearest = broken.find((finding) => finding.nearest)?.nearest;
  const limits = [
    ...broken.map(({ message }) => message),
    ...(broken.length > 0
      ? [nearest ? `Nearest allowed: ${nearest}.` : 'No setting is allowed at this size.']
      : []),
  ].join(' ');
  if (!values) return { name, values: '', limits };
  const merit = figureOfMerit(values, cost);
  const share = merit !== null && best ? `, ${formatPercent(merit / best)} of the best` : '';
  const with_ = (value: number | null, words: string, unit: string): string[] =>
    value === null ? [] : [`${words} ${formatNumber(value)}${unit ? ` ${unit}` : ''}`];
  const list = [
    `SdNR² ${formatNumber(merit)} per ${costs[cost].unit} ${costs[cost].words}${share}`,
    ...with_(values.sdnr, 'SdNR', ''),
    ...with_(values.incidentAirKerma_mGy, 'incident air kerma', 'mGy'),
    ...with_(values.energyImparted_mJ, 'energy imparted', 'mJ'),
    ...with_(values.detectorAirKerma_uGy, 'detector air kerma', 'µGy'),
    ...with_(values.tubeLoad_mAs, 'tube load', 'mAs'),
    ...with_(values.power_kW, 'power', 'kW'),
  ];
  return { name, values: `${list.join('; ')}.`, limits };
}
