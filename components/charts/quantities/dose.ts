import { inGroup } from './quantity.js';

/** Every dose quantity by its own name. */
export const doseQuantities = inGroup('dose', [
  {
    id: 'incidentAirKerma',
    name: 'Incident air kerma',
    unit: 'mGy',
    per: 'per frame',
    of: (e) => e.dose.incidentAirKerma_mGy,
    words:
      'Air kerma of the primary beam on the axis at the skin, behind air and support, without backscatter and without what the support scatters forward.',
  },
  {
    id: 'entranceSurfaceAirKerma',
    name: 'Entrance surface air kerma',
    unit: 'mGy',
    per: 'per frame',
    of: (e) => e.dose.entranceSurfaceAirKerma_mGy,
    words: 'Incident air kerma times the backscatter factor of this beam, field and stack.',
  },
  {
    id: 'backscatterFactor',
    name: 'Backscatter factor',
    unit: '',
    of: (e) => e.dose.backscatterFactor,
    words:
      'Entrance surface air kerma over incident air kerma: it counts scatter back from the patient and, behind a support, forward from the support.',
  },
  {
    id: 'referenceAirKerma',
    name: 'Reference air kerma',
    unit: 'mGy',
    per: 'per frame',
    of: (e) => e.dose.referenceAirKerma_mGy,
    words:
      'Air kerma in free air at the room’s reference point, before any support, without backscatter.',
  },
  {
    id: 'kermaAreaProduct',
    name: 'Kerma–area product',
    unit: 'Gy cm²',
    per: 'per frame',
    of: (e) => e.dose.kermaAreaProduct_Gycm2,
    words:
      'Reference air kerma times the area of the field at the reference point, before any support; of a point source, much the same at any distance.',
  },
  {
    id: 'energyImparted',
    name: 'Energy imparted',
    unit: 'mJ',
    per: 'per frame',
    of: (e) => e.dose.energyImparted_mJ,
    words:
      'Energy of the whole field that stays in the patient, from primary and scattered photons.',
  },
  {
    id: 'meanAbsorbedDose',
    name: 'Mean absorbed dose',
    unit: 'mGy',
    per: 'per frame',
    of: (e) => e.dose.meanAbsorbedDose_mGy,
    words: 'Energy imparted over the mass of all layers inside the field.',
  },
  {
    id: 'skinAbsorbedDose',
    name: 'Skin absorbed dose',
    unit: 'mGy',
    per: 'per frame',
    of: (e) => e.dose.skinAbsorbedDose_mGy,
    words:
      'Entrance surface air kerma times the ratio of mass energy-absorption coefficients μen/ρ, skin (ICRU 46 composition) over air, averaged over the incident beam.',
  },
  {
    id: 'incidentAirKermaRate',
    name: 'Incident air kerma rate',
    unit: 'mGy/min',
    per: 'per minute',
    of: (e) => e.dose.incidentAirKermaRate_mGy_per_min,
    words:
      'Incident air kerma per frame times the frames per minute; a single radiograph has no rate.',
  },
  {
    id: 'runIncidentAirKerma',
    name: 'Incident air kerma',
    unit: 'mGy',
    per: 'per run',
    of: (e) => e.dose.perRun.incidentAirKerma_mGy,
    words: 'Incident air kerma per frame times all frames of the run, masks counted.',
  },
  {
    id: 'runKermaAreaProduct',
    name: 'Kerma–area product',
    unit: 'Gy cm²',
    per: 'per run',
    of: (e) => e.dose.perRun.kermaAreaProduct_Gycm2,
    words: 'Kerma–area product per frame times all frames of the run, masks counted.',
  },
]);
