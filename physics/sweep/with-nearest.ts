import { isAllowedBySetting, isOfSetting } from '../limits.js';
import { settingLabel } from '../setting.js';
import { distance_kV } from './nearness.js';
import type { SweepSetting } from './sweep-setting.js';

/**
 * Settings of one size, each limit that another setting might meet naming the nearest setting that
 * is allowed; null where the whole sweep holds none.
 */
export const withNearest = <S extends SweepSetting>(
  settings: readonly S[],
  filters: readonly string[],
): S[] => {
  const place = (setting: SweepSetting) => ({
    potential_kV: setting.potential_kV,
    filterPlace: filters.indexOf(setting.filter),
  });
  const allowed = settings
    .filter(({ values, findings }) => values !== null && isAllowedBySetting(findings))
    .map((setting) => ({ ...place(setting), label: settingLabel(setting) }));
  return settings.map((setting) => {
    if (!setting.findings.some(isOfSetting)) return setting;
    const here = place(setting);
    let least_kV = Number.POSITIVE_INFINITY;
    let nearest: string | null = null;
    for (const candidate of allowed) {
      const far_kV = distance_kV(here, candidate);
      if (far_kV < least_kV) [least_kV, nearest] = [far_kV, candidate.label];
    }
    const findings = setting.findings.map((finding) =>
      isOfSetting(finding) ? { ...finding, nearest } : finding,
    );
    return { ...setting, findings };
  });
};
