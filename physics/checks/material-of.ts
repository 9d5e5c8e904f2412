import { type Material, namedMaterial } from '../../materials/index.js';

/** Names of the reference files, where they differ from ours. */
const ourNames: Readonly<Record<string, string>> = {
  bone_cortical_icru44: 'cortical bone',
  tissue_soft_icru44: 'soft tissue',
  muscle_skeletal_icru44: 'muscle',
  adipose_icru44: 'adipose',
  blood_whole_icru44: 'blood',
  breast_icru44: 'breast',
  brain_icru44: 'brain',
  lung_icru44: 'lung deflated',
  lung_inflated: 'lung',
  cesium_iodide: 'caesium iodide',
  cadmium_telluride: 'cadmium telluride',
  gadolinium_oxysulfide: 'gadolinium oxysulfide',
  soft_tissue_avg_male_icru46: 'soft tissue ICRU 46',
  liver_icru46: 'liver',
  kidney_icru46: 'kidney',
  skin_icru46: 'skin',
  spongiosa_icru46: 'spongiosa',
  mineral_bone_icrp110: 'mineral bone ICRP 110',
  'NIST-STAR Adipose Tissue (ICRP)': 'adipose ICRP',
  'NIST-STAR Blood (ICRP)': 'blood ICRP',
  'NIST-STAR Bone, Compact (ICRU)': 'compact bone ICRU',
  'NIST-STAR Bone, Cortical (ICRP)': 'cortical bone ICRP',
  'NIST-STAR Brain (ICRP)': 'brain ICRP',
  'NIST-STAR Lung (ICRP)': 'lung ICRP',
  'NIST-STAR Muscle, Skeletal': 'muscle ICRP',
  'NIST-STAR Muscle, Striated': 'muscle ICRU striated',
  'NIST-STAR Skin (ICRP)': 'skin ICRP',
  'NIST-STAR Tissue, Soft (ICRP)': 'soft tissue ICRP',
  'NIST-STAR Tissue, Soft (ICRU four-component)': 'soft tissue ICRU four-component',
};

/** The material a reference file means, or undefined where Stratabeam carries no such material. */
export const findMaterial = (name: string): Material | undefined =>
  namedMaterial(ourNames[name] ?? name);

/** The same, where there must be one. */
export const materialOf = (name: string): Material => {
  const material = findMaterial(name);
  if (!material) throw new Error(`${name}: no such material`);
  return material;
};
