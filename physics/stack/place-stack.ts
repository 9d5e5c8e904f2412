import type { Material } from '../../materials/material.js';
import type { Case, Layer, Size } from '../case/schema.js';
import { numberText } from '../number-text.js';
import type { Finding } from '../results.js';
import { anchoredDistances, type Distances } from './anchor.js';
import { drawnThickness_mm, grownThicknesses_mm, growthShares } from './grow-layers.js';
import { layerMaterial, resolveMaterial } from './resolve-material.js';
import type { Stack, StackLayer } from './stack.js';

/** What cannot be computed at this size, and why. */
export interface Unplaceable {
  readonly findings: readonly Finding[];
}

const total_mm = (slabs: readonly StackLayer[]): number =>
  slabs.reduce((sum, slab) => sum + slab.thickness_mm, 0);

const sharesFinding: Finding = {
  code: 'growthShares',
  severity: 'limit',
  message:
    'The growth shares of the layers do not sum to 1; enter shares that do, or leave all out.',
  path: 'patient.layers',
};

const vanishedFindings = (
  layers: readonly Layer[],
  thicknesses_mm: readonly number[],
  size: Size,
): Finding[] =>
  layers.flatMap((layer, i): Finding[] =>
    thicknesses_mm[i] > 0
      ? []
      : [
          {
            code: 'layerVanishes',
            severity: 'limit',
            message: `Layer ${layer.name} would be ${numberText(thicknesses_mm[i])} mm thick in a patient of ${numberText(size.thickness_mm)} mm (${size.name}); give it a smaller growth share.`,
            path: `patient.layers[${i}].growthShare`,
            value: thicknesses_mm[i],
            bound: 0,
          },
        ],
  );

const distanceFindings = (
  size: Size,
  distances: Distances,
  entranceSupport_mm: number,
  exitSupport_mm: number,
): Finding[] => {
  const findings: Finding[] = [];
  if (distances.exitToDetector_mm < exitSupport_mm) {
    findings.push({
      code: 'gapNegative',
      severity: 'limit',
      message: `At ${numberText(size.thickness_mm)} mm (${size.name}) only ${numberText(distances.exitToDetector_mm)} mm are left between patient and detector, and ${numberText(exitSupport_mm)} mm of support stand there; move the detector or change the anchor.`,
      path: 'room.geometry.exitToDetector_mm',
      value: distances.exitToDetector_mm,
      bound: exitSupport_mm,
    });
  }
  if (distances.sourceToSkin_mm <= entranceSupport_mm) {
    findings.push({
      code: 'sourceInsidePatient',
      severity: 'limit',
      message: `At ${numberText(size.thickness_mm)} mm (${size.name}) the skin would be ${numberText(distances.sourceToSkin_mm)} mm from the focal spot, with ${numberText(entranceSupport_mm)} mm of support between; lengthen the distance from source to detector.`,
      path: 'room.geometry.sourceToDetector_mm',
      value: distances.sourceToSkin_mm,
      bound: entranceSupport_mm,
    });
  }
  return findings;
};

/**
 * The patient at one size, in the room: layers grown from the drawing and anchored between focal
 * spot and detector. Support keeps its thickness and lies outside the patient. Whether the skin is
 * nearer than the room's least distance is a limit of the room, judged elsewhere.
 *
 * @returns the stack, or findings when this size has no such stack: a layer would vanish, the gap
 * to the detector would be negative, or the source would lie inside the patient.
 */
export const placeStack = (
  c: Case,
  size: Size,
  materials: (name: string) => Material = resolveMaterial(c),
): Stack | Unplaceable => {
  const { geometry, support } = c.room;
  const { layers } = c.patient;
  const shares = growthShares(layers);
  if (shares === null) return { findings: [sharesFinding] };
  const thicknesses_mm = grownThicknesses_mm(layers, shares, size.thickness_mm);
  const side = (wanted: 'entrance' | 'exit'): StackLayer[] =>
    support
      .filter((slab) => slab.side === wanted && slab.thickness_mm > 0)
      .map(({ material, thickness_mm }) => ({
        name: material,
        material: materials(material),
        thickness_mm,
      }));
  const supportEntrance = side('entrance');
  const supportExit = side('exit');
  const distances = anchoredDistances(geometry, drawnThickness_mm(layers), size.thickness_mm);
  const findings = [
    ...vanishedFindings(layers, thicknesses_mm, size),
    ...distanceFindings(size, distances, total_mm(supportEntrance), total_mm(supportExit)),
  ];
  if (findings.length > 0) return { findings };
  return {
    sizeName: size.name,
    thickness_mm: size.thickness_mm,
    layers: layers.map((layer, i) => ({
      name: layer.name,
      material: layerMaterial(c, layer),
      thickness_mm: thicknesses_mm[i],
    })),
    supportEntrance,
    supportExit,
    beam: geometry.beam,
    sourceToDetector_mm: geometry.sourceToDetector_mm,
    ...distances,
    field_mm: geometry.field_mm,
    air: geometry.air,
  };
};
