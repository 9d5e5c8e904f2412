import { drawnThickness_mm, grownThicknesses_mm, growthShares } from '../../stack/grow-layers.js';
import { type Fault, faultAt } from '../fault.js';
import type { Case } from '../schema.js';
import { agentFaults } from './agent-rules.js';
import { unknownMaterialFaults } from './material-rules.js';
import { uniqueNameFaults } from './unique-names.js';

/** How far entered growth shares may sum from 1. */
const shareTolerance = 1e-6;

type Patient = Case['patient'];

/** Layers and sizes: names, shares of growth, and no layer vanishing at any size. */
export const patientFaults = ({ patient }: Pick<Case, 'patient'>): Fault[] => {
  const shares = shareFaults(patient);
  return [
    ...uniqueNameFaults(['patient', 'layers'], patient.layers),
    ...uniqueNameFaults(['patient', 'sizes'], patient.sizes),
    ...shares,
    ...(shares.length === 0 ? vanishingFaults(patient) : []),
    ...weightFaults(patient),
  ];
};

/** Every material and agent that the patient names must be known. */
export const patientMaterialFaults = (c: Pick<Case, 'patient' | 'materials'>): Fault[] =>
  c.patient.layers.flatMap(({ material, agent }, index) => {
    const path = ['patient', 'layers', index];
    return [
      ...unknownMaterialFaults([...path, 'material'], material, c),
      ...agentFaults([...path, 'agent'], agent, c),
    ];
  });

const shareFaults = ({ layers }: Patient): Fault[] => {
  const given = layers.flatMap(({ growthShare }) => growthShare ?? []);
  if (given.length === 0) return [];
  const path = ['patient', 'layers'];
  if (given.length < layers.length) {
    const index = layers.findIndex(({ growthShare }) => growthShare === null);
    const rule = 'must be given in every layer or in none';
    return [
      faultAt(
        [...path, index, 'growthShare'],
        undefined,
        rule,
        'enter 0 where a layer does not grow',
      ),
    ];
  }
  const sum = given.reduce((total, share) => total + share, 0);
  if (Math.abs(sum - 1) <= shareTolerance) return [];
  const rule = 'must have growth shares that sum to 1';
  const remedy = `scale them; they sum to ${Number(sum.toPrecision(6))}`;
  return [faultAt(path, layers, rule, remedy)];
};

/** At each size every layer must keep some thickness. */
const vanishingFaults = ({ layers, sizes }: Patient): Fault[] => {
  const shares = growthShares(layers);
  if (shares === null) return [];
  return sizes.flatMap(({ thickness_mm }, index) => {
    const grown = grownThicknesses_mm(layers, shares, thickness_mm);
    const thinnest = grown.findIndex((thickness) => thickness <= 0);
    if (thinnest < 0) return [];
    const rule = `must leave layer "${layers[thinnest].name}" some thickness`;
    const drawn = Number(drawnThickness_mm(layers).toPrecision(6));
    const remedy = `enter a larger size (as drawn: ${drawn}) or another growthShare`;
    return [faultAt(['patient', 'sizes', index, 'thickness_mm'], thickness_mm, rule, remedy)];
  });
};

const weightFaults = ({ sizes }: Patient): Fault[] =>
  sizes.length === 0 || sizes.some(({ weight }) => weight > 0)
    ? []
    : [
        faultAt(
          ['patient', 'sizes'],
          sizes,
          'must have a positive weight',
          "enter each size's share of patients",
        ),
      ];
