import { barInputs, barInputsAtDepth } from './bar-inputs.ts';
import type { DemoCase } from './demo-case.ts';

const oxide = 'analyst-oxide@marrowdene.example';
const secondReader = 'second-reader@marrowdene.example';
const halfRound = { shapeFactor: '1.29', shapeFactorPercent: 6, sizePercent: 10 } as const;
const roundInside = { shapeFactor: '1.128', shapeFactorPercent: 8, sizePercent: 12 } as const;
const barQuestions = ['Where did the bar break from, and what is the origin?', 'What stress did the origin carry?'];
const barAsked = 'Ordinary bar of its lot, or is something wrong with the lot?';
const bench = 'bench 2, tray';
const ordinaryAsked = {
  kind: 'test specimen',
  urgency: 'routine',
  organisation: 'Ostrevell Ceramics',
  material: 'alumina AL-31',
} as const;

const barPieces = (place: string) => [
  { description: 'left half, face A', massText: '1.02 g ± 0.01 g', place },
  { description: 'right half, face B', massText: '1.05 g ± 0.01 g', place },
];

export const oxideCases: readonly DemoCase[] = [
  {
    ...ordinaryAsked,
    code: '0001',
    title: 'Bend bar A-17, lowest quarter of its lot',
    summary: 'Broke in the four-point bend test of lot LOT-A at 421 N, inside the inner span.',
    holder: oxide,
    questions: [...barQuestions, barAsked],
    background: [
      {
        statement: 'Breaking load 421 N, spans 40 and 20 mm, broke between the inner rollers.',
        standing: 'known',
        source: 'test record of A-17',
      },
      {
        statement: 'Section 4.01 × 3.00 mm, edges not broken.',
        standing: 'known',
        source: 'micrometer, before the test',
      },
      { statement: 'Powder PB-7, firing run K-118.', standing: 'told', source: 'Yevka Sorrel, Ostrevell' },
      { statement: 'Rollers turned freely.', standing: 'assumed', source: 'nothing found against it' },
    ],
    part: {
      description: 'Bend bar A-17, 3 × 4 × 45 mm',
      serial: 'A-17',
      maker: 'Ostrevell Ceramics',
      environment: 'air, 23 °C',
    },
    pieces: barPieces(bench),
    readings: [
      {
        figure: 2,
        by: oxide,
        originCode: 'P',
        certainty: 'certain',
        boundary: 'outer',
        place: 'surface',
        flawShape: 'half-ellipse',
        note: 'Pore cut by the tensile surface',
      },
    ],
    estimates: [
      {
        reading: 0,
        load: { method: 'bend4.rect', inputs: barInputs({ loadN: 421, widthMm: 4.01, depthMm: 3 }) },
        mirror: { radiusPercent: 6 },
        flaw: halfRound,
      },
    ],
    findings: {
      'What was asked':
        'Ostrevell asked where bar A-17 broke from, what stress its origin carried, and whether it is an ordinary bar of its lot.',
      'What came in':
        'Two halves, clean, with the tensile face marked. Nothing is missing that could carry the origin.',
      'What the surface shows':
        'The break started at a pore cut by the tensile surface. Mirror and hackle lead back to it from all sides. {fig:2}',
      'Stress at the origin':
        'By load and section the outer fibre carried {load}; the mirror gives {mirror}; the pore, with the toughness of the material, gives {flaw}.',
      'Why it broke there':
        'The three agree within their intervals: an ordinary pore at the stress that acted. Nothing points to damage after making.',
      'What else is at risk': 'Nothing beyond what the strength distribution of the lot already says.',
      'What to do': 'Nothing. This is not leave to use other parts; that is for the responsible engineer.',
    },
    end: 'closed',
    sentOn: '2026-05-20',
    closedOn: '2026-05-22',
  },
  {
    code: '0002',
    title: 'Seal ring 6 mm, cracked through in the box',
    summary: 'One ring of a delivery was found cracked through when unpacked; it had not been mounted.',
    kind: 'service part',
    urgency: 'routine',
    organisation: 'Ostrevell Ceramics',
    material: 'alumina AL-31',
    holder: oxide,
    questions: [
      'Was the ring cracked by making or by handling?',
      'How high was the stress?',
      'Are other rings of the delivery damaged?',
    ],
    background: [
      {
        statement: 'Ring taken from the middle of the box, beside two others touching it.',
        standing: 'told',
        source: 'store of the customer, by telephone',
      },
      {
        statement: 'Lot LOT-A by certificate in the box.',
        standing: 'known',
        source: 'certificate, photograph in the case',
      },
      { statement: 'The box was not dropped.', standing: 'told', source: 'carrier' },
      {
        statement: 'A claim is announced; pieces and files are kept until it is settled.',
        standing: 'known',
        source: 'letter through Yevka Sorrel, Ostrevell',
      },
      {
        statement: 'No load other than handling before the crack.',
        standing: 'assumed',
        source: 'the ring was never mounted',
      },
    ],
    part: {
      description: 'Seal ring, 6 mm section',
      serial: 'SR-0417',
      maker: 'Ostrevell Ceramics',
      environment: 'air',
    },
    pieces: [
      { description: 'larger part of the ring, face A', massText: '21.4 g ± 0.1 g', place: 'safe S1' },
      { description: 'smaller part, face B', massText: '9.8 g ± 0.1 g', place: 'safe S1' },
      {
        description: 'slivers of the chipped edge',
        place: 'not found',
        missing: { reason: 'not in the box; searched for twice', originLies: 'no' },
      },
    ],
    readings: [
      {
        figure: 2,
        by: oxide,
        originCode: 'HD',
        certainty: 'certain',
        boundary: 'outer',
        place: 'edge',
        flawShape: 'quarter-ellipse',
        note: 'Chip at the edge, contact from outside',
      },
    ],
    estimates: [
      {
        reading: 0,
        mirror: { radiusPercent: 6 },
        flaw: { shapeFactor: '1.29', shapeFactorPercent: 8, sizePercent: 12 },
      },
    ],
    findings: {
      'What was asked': 'Whether the ring was cracked by making or by handling, and what that means for the delivery.',
      'What came in':
        'Two parts of one ring. Slivers of the chipped edge are missing; the crack passes below them, so the origin does not lie on them.',
      'What the surface shows': 'The crack starts at a chip of the outer edge, made by contact from outside. {fig:2}',
      'Stress at the origin':
        'The mirror gives {mirror}, the chip with the toughness gives {flaw}. No load is known, so two lines stand, and both are read on one scale.',
      'Why it broke there':
        'Handling damage at an edge, no flaw of the lot. Rings touching each other in the box are compatible with it.',
      'What else is at risk': 'Rings packed touching each other.',
      'What to do': 'Keep rings apart in the box and look at the edges of this delivery.',
    },
    end: 'closed',
    sentOn: '2026-06-15',
    closedOn: '2026-06-19',
  },
  {
    ...ordinaryAsked,
    code: '0003',
    title: 'Bend bar B-09, far below its lot',
    summary: 'Broke at 279 N, the sixth weakest of thirty; the lot shows twice the scatter of the one before it.',
    holder: oxide,
    questions: [...barQuestions, 'Is this the flaw that makes the lot weak?'],
    background: [
      {
        statement: 'Breaking load 279 N, spans 40 and 20 mm, broke between the inner rollers.',
        standing: 'known',
        source: 'test record of B-09',
      },
      {
        statement: 'Section 4.03 × 2.98 mm, edges not broken.',
        standing: 'known',
        source: 'micrometer, before the test',
      },
      {
        statement: 'Powder PB-8, firing run K-124; the sieve was changed between PB-7 and PB-8.',
        standing: 'told',
        source: 'Radek Imber, Ostrevell',
      },
    ],
    part: {
      description: 'Bend bar B-09, 3 × 4 × 45 mm',
      serial: 'B-09',
      maker: 'Ostrevell Ceramics',
      environment: 'air, 22 °C',
    },
    pieces: barPieces(bench),
    readings: [
      {
        figure: 1,
        by: oxide,
        originCode: 'A',
        certainty: 'certain',
        boundary: 'outer',
        place: 'interior',
        flawShape: 'ellipse',
        note: 'Agglomerate, centre 300 µm below the tensile face',
      },
    ],
    estimates: [
      {
        reading: 0,
        load: {
          method: 'bend4.rect.local',
          inputs: barInputsAtDepth({ loadN: 279, widthMm: 4.03, depthMm: 2.98 }, 0.3),
        },
        mirror: { radiusPercent: 6 },
        flaw: roundInside,
        remark: 'The mirror takes 0.65 of the depth; read along the tensile side only',
      },
    ],
    findings: {
      'What was asked':
        'Where bar B-09 broke from, at what stress, and whether this is the flaw that makes the lot weak.',
      'What came in': 'Two halves, clean, nothing missing.',
      'What the surface shows': 'The break started inside, at an agglomerate parted from the body round it. {fig:1}',
      'Stress at the origin':
        'At the depth of the origin the bend test gives {load}; the mirror gives {mirror}; the agglomerate gives {flaw}. The mirror is large against the section and is read with that caution.',
      'Why it broke there': 'An agglomerate of hard powder that shrank away from the body on firing.',
      'What else is at risk': 'Everything made of powder PB-8: the stock of LOT-B and its sibling LOT-E.',
      'What to do': 'Hold LOT-B and LOT-E; look at the sieve of PB-8.',
    },
    end: 'closed',
    sentOn: '2026-06-09',
    closedOn: '2026-06-12',
  },
  {
    ...ordinaryAsked,
    code: '0004',
    title: 'Bend bar B-22, origin read twice',
    summary: 'Broke at 372 N. The first reader took a surface pit for the origin; a second reader traced the hackle.',
    holder: oxide,
    questions: [...barQuestions, barAsked],
    background: [
      {
        statement: 'Breaking load 372 N, spans 40 and 20 mm, broke between the inner rollers.',
        standing: 'known',
        source: 'test record of B-22',
      },
      {
        statement: 'Section 4.01 × 2.99 mm, edges not broken.',
        standing: 'known',
        source: 'micrometer, before the test',
      },
      { statement: 'Powder PB-8, firing run K-124.', standing: 'told', source: 'Radek Imber, Ostrevell' },
    ],
    part: {
      description: 'Bend bar B-22, 3 × 4 × 45 mm',
      serial: 'B-22',
      maker: 'Ostrevell Ceramics',
      environment: 'air, 22 °C',
    },
    pieces: barPieces(bench),
    readings: [
      {
        figure: 2,
        by: oxide,
        originCode: 'PT',
        certainty: 'likely',
        boundary: 'outer',
        place: 'surface',
        flawShape: 'half-ellipse',
        note: 'Pit at the tensile surface',
        ofBystander: true,
        mirrorRadiusUm: 900,
      },
      {
        figure: 4,
        by: secondReader,
        originCode: 'A',
        certainty: 'certain',
        boundary: 'outer',
        place: 'interior',
        flawShape: 'ellipse',
        note: 'Hackle leads to the agglomerate, not to the pit',
      },
    ],
    estimates: [
      {
        reading: 0,
        load: { method: 'bend4.rect', inputs: barInputs({ loadN: 372, widthMm: 4.01, depthMm: 2.99 }) },
        mirror: { radiusPercent: 6 },
        flaw: halfRound,
        remark: 'First reading',
      },
      {
        reading: 1,
        load: {
          method: 'bend4.rect.local',
          inputs: barInputsAtDepth({ loadN: 372, widthMm: 4.01, depthMm: 2.99 }, 0.18),
        },
        mirror: { radiusPercent: 6 },
        flaw: roundInside,
        remark: 'Second reading, origin at the agglomerate',
      },
    ],
    findings: {
      'What was asked': 'Where bar B-22 broke from, at what stress, and whether it is an ordinary bar of its lot.',
      'What came in': 'Two halves, clean, nothing missing.',
      'What the surface shows':
        'The first reading took a pit at the tensile surface for the origin. Hackle on both faces leads past it to an agglomerate below. {fig:4}',
      'Stress at the origin':
        'At the agglomerate the bend test gives {load}, the mirror {mirror} and the flaw {flaw}. With the pit as origin the flaw line stood alone and high.',
      'Why it broke there': 'The same kind of agglomerate as in HB-2026-0003.',
      'What else is at risk': 'As in HB-2026-0003.',
      'What to do': 'As in HB-2026-0003; in this laboratory, a second reader for every origin near a surface.',
    },
    end: 'in review',
    sentOn: '2026-10-05',
  },
];
