import type { ConstantKind, MaterialFamily } from '#shared/vocabulary/constant-kinds.ts';

type DemoConstant = { kind: ConstantKind; value: string; expandedUncertainty: string };
type DemoMaterial = { name: string; family: MaterialFamily; route: string; constants: readonly DemoConstant[] };

// Of the usual order of size for each family, from memory; for trying the product, not for design.
export const demoConstantSource = 'Demo value, not for design; of the usual order of size';

export const demoMaterials = [
  {
    name: 'alumina AL-31',
    family: 'alumina',
    route: 'pressed, fired in air, ground',
    constants: [
      { kind: 'toughness', value: '3.5 MPa√m', expandedUncertainty: '0.2 MPa√m' },
      { kind: 'mirror constant, outer', value: '8.5 MPa√m', expandedUncertainty: '0.6 MPa√m' },
    ],
  },
  {
    name: 'soda-lime glass, annealed',
    family: 'glass, annealed',
    route: 'float, edges ground',
    constants: [
      { kind: 'toughness', value: '0.75 MPa√m', expandedUncertainty: '0.04 MPa√m' },
      { kind: 'mirror constant, inner', value: '1.8 MPa√m', expandedUncertainty: '0.1 MPa√m' },
    ],
  },
  {
    name: 'soda-lime glass, tempered',
    family: 'glass, tempered',
    route: 'float, thermally tempered',
    constants: [
      { kind: 'toughness', value: '0.75 MPa√m', expandedUncertainty: '0.04 MPa√m' },
      { kind: 'mirror constant, inner', value: '1.8 MPa√m', expandedUncertainty: '0.1 MPa√m' },
    ],
  },
  {
    name: 'borosilicate glass BG-2',
    family: 'glass, annealed',
    route: 'pressed, fire-polished',
    constants: [
      { kind: 'toughness', value: '0.75 MPa√m', expandedUncertainty: '0.04 MPa√m' },
      { kind: 'mirror constant, inner', value: '1.9 MPa√m', expandedUncertainty: '0.12 MPa√m' },
    ],
  },
  {
    name: 'dental zirconia Z-3',
    family: 'zirconia',
    route: 'milled, fired, polished',
    constants: [
      { kind: 'toughness', value: '4.8 MPa√m', expandedUncertainty: '0.3 MPa√m' },
      { kind: 'mirror constant, outer', value: '10.5 MPa√m', expandedUncertainty: '1.0 MPa√m' },
    ],
  },
  {
    name: 'electrical porcelain C-120',
    family: 'porcelain',
    route: 'extruded, turned, glazed, fired',
    constants: [{ kind: 'toughness', value: '1.5 MPa√m', expandedUncertainty: '0.1 MPa√m' }],
  },
  {
    name: 'hardmetal HM-10',
    family: 'hardmetal',
    route: 'pressed, liquid-phase fired, ground',
    constants: [{ kind: 'toughness', value: '10.5 MPa√m', expandedUncertainty: '0.6 MPa√m' }],
  },
  { name: 'cordierite KP-1', family: 'other', route: 'pressed, coarse, porous', constants: [] },
] as const satisfies readonly DemoMaterial[];

export type DemoMaterialName = (typeof demoMaterials)[number]['name'];
