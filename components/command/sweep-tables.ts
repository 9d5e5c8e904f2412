import type { Case } from '../../physics/case/index.js';
import { caseHash } from '../../physics/case/index.js';
import { holdConstantWords } from '../../physics/compare.js';
import { isAllowed } from '../../physics/limits.js';
import { settingLabel } from '../../physics/setting.js';
import { type CostName, costNames, costs, figureOfMerit } from '../../physics/sweep/costs.js';
import { window90_kV } from '../../physics/sweep/window.js';
import type { MappedSetting, Sweep } from '../../physics/sweep.js';
import { version } from '../../physics/version.js';
import { limitName } from '../charts/limit-names.js';
import { shown } from './numbers.js';
import { plainTableText } from './plain-table.js';

/** Members of a frontier listed for people; the CSV holds all. */
const listed = 20;

/** A sweep for people: per size the best setting by every cost, the frontier, and what is forbidden. */
export const sweepTables = (c: Case, swept: Sweep): string => {
  const { axes, holdConstant, investigationalAgent, findings } = swept;
  const heading = `${c.title || 'Untitled case'}\ncase ${caseHash(c)}, Stratabeam ${version}\n`;
  const condition = `${c.techniques[0].name}: its grid and acquisition, ${holdConstantWords[holdConstant]}; one frame\n`;
  const parts = axes.size.flatMap((size) => sizeParts(swept, size));
  const notes = [
    ...(investigationalAgent
      ? [`${investigationalAgent}: investigational agent, not in clinical use`]
      : []),
    ...findings.map(({ severity, message }) => `${severity}: ${message}`),
  ];
  return [
    heading + condition,
    ...parts,
    ...(notes.length > 0 ? [`${notes.join('\n')}\n`] : []),
  ].join('\n');
};

const sizeParts = (swept: Sweep, size: string): string[] => {
  const settings = swept.settings.filter((setting) => setting.size === size);
  if (settings.length === 0) return [`Size ${size}: nothing could be computed\n`];
  return [bestTable(settings, size), frontierTable(swept, settings), forbiddenText(settings)];
};

/** The best allowed setting by SdNR² per every cost that is known and not the same everywhere. */
const bestTable = (settings: readonly MappedSetting[], size: string): string => {
  const rows = costNames.flatMap((cost) => {
    const best = bestBy(settings, cost);
    if (!best?.values || !tellsApart(settings, cost)) return [];
    const line = settings.filter(({ filter }) => filter === best.filter);
    const { values } = best;
    return [
      [
        costs[cost].words,
        settingLabel(best),
        window90_kV(line, cost, best.potential_kV).join('–'),
        shown(costs[cost].of(values)),
        costs[cost].unit,
        shown(values.sdnr),
        shown(values.detectorAirKerma_uGy),
        shown(values.tubeLoad_mAs),
        shown(values.power_kW),
      ],
    ];
  });
  return plainTableText({
    title: `Size ${size}: best allowed setting by SdNR² per …`,
    headings: ['cost', 'setting', '90 % kV', 'at cost', 'unit', 'SdNR', 'det µGy', 'mAs', 'kW'],
    rows: rows.length > 0 ? rows : [['no setting is allowed']],
    wordColumns: 3,
  });
};

const tellsApart = (settings: readonly MappedSetting[], cost: CostName): boolean => {
  const merits = settings.flatMap(({ values }) => (values && figureOfMerit(values, cost)) ?? []);
  return Math.max(...merits) > Math.min(...merits) * (1 + 1e-9);
};

const bestBy = (settings: readonly MappedSetting[], cost: CostName): MappedSetting | null => {
  let best: { setting: MappedSetting; merit: number } | null = null;
  for (const setting of settings) {
    if (!setting.values || !isAllowed(setting.findings)) continue;
    const merit = figureOfMerit(setting.values, cost);
    if (merit !== null && merit > (best?.merit ?? 0)) best = { setting, merit };
  }
  return best?.setting ?? null;
};

const frontierTable = ({ frontier }: Sweep, settings: readonly MappedSetting[]): string => {
  const [first] = frontier.costs;
  const members = settings
    .filter(({ onFrontier }) => onFrontier)
    .sort((a, b) => paid(a, first) - paid(b, first));
  const words = frontier.costs.map((cost) => costs[cost].words);
  const more = members.length > listed ? `, ${listed} of them listed` : '';
  return plainTableText({
    title: `Frontier by ${words.join(', ')} and SdNR: ${members.length} of ${settings.length} settings${more}`,
    headings: [
      'setting',
      ...frontier.costs.map((cost) => `${costs[cost].words} ${costs[cost].unit}`),
      'SdNR',
    ],
    rows: spread(members, listed).map((member) => [
      settingLabel(member),
      ...frontier.costs.map((cost) => shown(paid(member, cost))),
      shown(member.values?.sdnr),
    ]),
  });
};

/** At most so many of a list, evenly along it, both ends kept. */
const spread = <T>(list: readonly T[], most: number): T[] =>
  list.length <= most
    ? [...list]
    : Array.from(
        { length: most },
        (_, i) => list[Math.round((i * (list.length - 1)) / (most - 1))],
      );

const paid = ({ values }: MappedSetting, cost: CostName): number =>
  (values && costs[cost].of(values)) ?? Number.NaN;

/** How many settings each limit forbids. */
const forbiddenText = (settings: readonly MappedSetting[]): string => {
  const counts = new Map<string, number>();
  for (const { findings } of settings) {
    const codes = findings.filter(({ severity }) => severity === 'limit').map(({ code }) => code);
    for (const code of new Set(codes)) counts.set(code, (counts.get(code) ?? 0) + 1);
  }
  const forbidden = settings.filter(({ findings }) => !isAllowed(findings)).length;
  if (forbidden === 0) return `Nothing forbids any of the ${settings.length} settings.\n`;
  const list = [...counts].sort((a, b) => b[1] - a[1]);
  return `${forbidden} of ${settings.length} settings are forbidden: ${list
    .map(([code, count]) => `${count} ${limitName(code)}`)
    .join(', ')}.\n`;
};
