import {
  backscatterFactor,
  type Estimated,
  impartedEnergy_keV,
  layerEnergy_keV,
  scatterToPrimary,
  type TransportScores,
} from '../transport/index.js';
import { columnEnergy_keV } from './central-column.js';
import type { CheckSetup } from './check-setup.js';
import { statedAccuracy_percent } from './stated-accuracy.js';
import { type Judged, judge, photonsToDecide } from './verdict.js';

/** What a check compares. */
export type CheckedQuantity =
  | 'spr'
  | 'sprBehindGrid'
  | 'scatterFraction'
  | 'backscatterFactor'
  | 'energyImparted'
  | 'layerAbsorbedDose'
  | 'columnAbsorbedDose';

/** One quantity: estimate beside transport. Dose and energy are per frame as set. */
export interface CheckRow extends Judged {
  readonly quantity: CheckedQuantity;
  /** Of the layer's quantities; null for the others. */
  readonly layer: string | null;
  readonly name: string;
  readonly unit: string;
  /** Null where the estimate does not give it: then there is nothing to judge. */
  readonly estimate: number | null;
  readonly transport: Estimated;
  /** Greatest difference stated for the estimate. */
  readonly tolerance_percent: number | null;
  /** Photons after which a verdict falls (see `photonsToDecide`); null where there is none to fall. */
  readonly photonsToDecide: number | null;
}

const mJ_per_mGy_g = 1e-3;

/**
 * The table of a run, whole or under way. Scatter is of detector signal at the field centre; dose of
 * a layer is its infinite-width average (all energy absorbed, over the mass in the field), that of
 * the central column what the middle of the field receives.
 */
export const checkRows = (setup: CheckSetup, scores: TransportScores): CheckRow[] => {
  const { input, estimate, hasGrid, measuredGridShare, pencilField_cm2 } = setup;
  const perFrame = (mass_g: number): number =>
    setup.incidentAirKerma_mGy / (input.primary.kermaAtSkin * mass_g);
  const row = rowOf(scores.photons);
  const spr = scatterToPrimary(input, scores);
  const open = 1 + spr.value;
  const rows: CheckRow[] = [
    row('spr', 'Scatter to primary, no grid', '', estimate.spr, spr),
    ...(hasGrid
      ? [
          row(
            'sprBehindGrid',
            'Scatter to primary, behind grid',
            '',
            estimate.sprBehindGrid,
            behindGrid(),
          ),
        ]
      : []),
    // d(SF)/SF = d(SPR)/SPR / (1 + SPR): error and tolerance shrink alike.
    row(
      'scatterFraction',
      'Scatter fraction, no grid',
      '',
      estimate.scatterFraction,
      { value: spr.value / open, standardError: times(spr, 1 / open ** 2).standardError },
      statedAccuracy_percent.spr / open,
    ),
    row(
      'backscatterFactor',
      'Backscatter factor',
      '',
      estimate.backscatterFactor,
      backscatterFactor(input, scores),
    ),
    row(
      'energyImparted',
      'Energy imparted',
      'mJ',
      estimate.energyImparted_mJ,
      times(impartedEnergy_keV(input, scores), perFrame(1) * pencilField_cm2 * mJ_per_mGy_g),
    ),
    ...input.layers.map(({ name, mass_g_per_cm2, area_cm2 }, k) =>
      row(
        'layerAbsorbedDose',
        'Absorbed dose',
        'mGy',
        estimate.layerAbsorbedDose_mGy?.[k] ?? null,
        times(layerEnergy_keV(input, scores, k), perFrame(mass_g_per_cm2 * area_cm2)),
        statedAccuracy_percent.layerAbsorbedDose,
        name,
      ),
    ),
    ...setup.column.map((part, k) =>
      row(
        'columnAbsorbedDose',
        'Absorbed dose, central column',
        'mGy',
        null,
        times(columnEnergy_keV(input, scores, part), perFrame(part.mass_g)),
        null,
        input.layers[k].name,
      ),
    ),
  ];
  return rows;

  function behindGrid(): Estimated {
    return measuredGridShare === null
      ? scatterToPrimary(input, scores, { behindGrid: true })
      : times(spr, measuredGridShare);
  }
};

const times = ({ value, standardError }: Estimated, factor: number): Estimated => ({
  value: value * factor,
  standardError: standardError === null ? null : standardError * factor,
});

const nothingToJudge = { difference_percent: null, z: null, verdict: null } as const;

const stated: Partial<Record<CheckedQuantity, number>> = statedAccuracy_percent;

const rowOf =
  (photons: number) =>
  (
    quantity: CheckedQuantity,
    name: string,
    unit: string,
    estimate: number | null,
    transport: Estimated,
    tolerance_percent: number | null = stated[quantity] ?? null,
    layer: string | null = null,
  ): CheckRow => {
    const isCompared = estimate !== null && tolerance_percent !== null;
    return {
      quantity,
      layer,
      name,
      unit,
      estimate,
      transport,
      tolerance_percent,
      ...(isCompared ? judge(estimate, transport, tolerance_percent) : nothingToJudge),
      photonsToDecide: isCompared
        ? photonsToDecide(estimate, transport, tolerance_percent, photons)
        : null,
    };
  };
