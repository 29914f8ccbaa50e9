import { barInputs } from './bar-inputs.ts';
import type { DemoCase } from './demo-case.ts';

const glass = 'analyst-glass@marrowdene.example';
const surfaceCrack = { shapeFactor: '1.29', shapeFactorPercent: 5, sizePercent: 10 } as const;

export const glassCases: readonly DemoCase[] = [
  {
    code: '0005',
    title: 'Glass strip 25 × 5.85 mm, broke in bending',
    summary:
      'Strip cut from a pane and broken in dry nitrogen at 657 N. The image was first bound to the wrong objective.',
    kind: 'test specimen',
    urgency: 'routine',
    organisation: 'Vantrisse Glazing',
    material: 'soda-lime glass, annealed',
    holder: glass,
    questions: ['What stress did the origin carry?', 'Is the edge as good as the maker says?'],
    background: [
      {
        statement: 'Breaking load 657 N, spans 100 and 50 mm, dry nitrogen.',
        standing: 'known',
        source: 'test record',
      },
      { statement: 'Section 25.0 × 5.85 mm.', standing: 'known', source: 'micrometer, before the test' },
    ],
    part: { description: 'Glass strip, 25.0 × 5.85 × 120 mm', serial: 'V-31', environment: 'dry nitrogen' },
    pieces: [
      { description: 'left half, face A', massText: '21.9 g ± 0.1 g', place: 'bench 4' },
      { description: 'right half, face B', massText: '21.2 g ± 0.1 g', place: 'bench 4' },
    ],
    readings: [
      {
        figure: 2,
        by: glass,
        originCode: 'HD',
        certainty: 'certain',
        boundary: 'inner',
        place: 'surface',
        flawShape: 'half-ellipse',
        boundTo: 'CAL-01',
      },
    ],
    estimates: [
      {
        reading: 0,
        load: {
          method: 'bend4.rect',
          inputs: barInputs({
            loadN: 657,
            loadPercent: 2,
            widthMm: 25,
            depthMm: 5.85,
            spansMm: [100, 50],
            allInLoad: true,
          }),
        },
        mirror: { radiusPercent: 4 },
        flaw: surfaceCrack,
      },
    ],
    findings: {
      'What was asked': 'What stress the origin of strip V-31 carried, and what that says of the edge.',
      'What the surface shows': 'A surface crack with a clear mirror, mist and hackle. {fig:2}',
      'Stress at the origin':
        'By load the outer fibre carried {load}. The mirror gives {mirror}. The crack, with the toughness of the glass, gives {flaw}. Mirror at {mirror} and crack at {flaw} stand together, and the load stands apart from both.',
      'Why it broke there':
        'A crack of that size breaks at {flaw}, so the strip was no weaker than its crack. What the mirror says, {mirror}, fits it.',
    },
    examinedOn: '2026-10-01',
    scaleFound: {
      on: '2026-10-14',
      reason: 'Taken with the 10× objective: the bar on the image is twice as long as 5× would show it',
    },
    end: 'drafting',
  },
  {
    code: '0006',
    title: 'Tempered panel 360 × 10 mm, broke in the bend frame',
    summary: 'Panel broken in a four-point frame at 6060 N; the surface stress was read beforehand by polariscope.',
    kind: 'service part',
    urgency: 'routine',
    organisation: 'Vantrisse Glazing',
    material: 'soda-lime glass, tempered',
    holder: glass,
    questions: ['Did the panel break at the stress it was made for?', 'What started it?'],
    background: [
      { statement: 'Breaking load 6060 N, spans 1000 and 200 mm.', standing: 'known', source: 'test record' },
      {
        statement: 'Surface stress −92 ± 10 MPa (compression).',
        standing: 'known',
        source: 'polariscope, before the test',
      },
      {
        statement: 'Own weight and the stress through the thickness are neglected.',
        standing: 'assumed',
        source: 'small against the load',
      },
      {
        statement: 'A second panel of the same charge waits; breaking it needs consent.',
        standing: 'told',
        source: 'Mireille Ashdow, Vantrisse',
      },
    ],
    part: { description: 'Tempered panel, 360 × 10 × 1100 mm', serial: 'T-208', environment: 'air' },
    pieces: [
      { description: 'piece with the origin, of many', massText: '0.212 kg ± 0.001 kg', place: 'boxed, cabinet C2' },
    ],
    readings: [
      {
        figure: 2,
        by: glass,
        originCode: 'HD',
        certainty: 'certain',
        boundary: 'inner',
        place: 'surface',
        flawShape: 'half-ellipse',
        note: 'Scratch at the glass surface',
      },
    ],
    estimates: [
      {
        reading: 0,
        load: {
          method: 'bend4.rect',
          inputs: barInputs({
            loadN: 6060,
            loadPercent: 3,
            widthMm: 360,
            depthMm: 10,
            spansMm: [1000, 200],
            allInLoad: true,
          }),
        },
        mirror: { radiusPercent: 5 },
        flaw: { shapeFactor: '1.29', shapeFactorPercent: 6, sizePercent: 10 },
        remark: 'Applied stress; the surface compression is not yet taken off',
      },
    ],
    findings: {
      'What was asked': 'Whether the panel broke at the stress it was made for, and what started it.',
      'What came in': 'The piece with the origin; the rest was swept up on site.',
      'What the surface shows': 'A scratch at the glass surface with a small mirror. {fig:2}',
      'Stress at the origin':
        'The load gives an applied {load}. The mirror gives {mirror} and the scratch {flaw}, both of the net stress: the surface compression of 92 ± 10 MPa lies between them.',
      'Why it broke there': 'Compatible with a scratch that reached through part of the compressed layer.',
      'What else is at risk': 'The second panel of the charge, which waits for consent.',
      'What to do': 'Ask for consent to break the second panel.',
    },
    examinedOn: '2026-10-06',
    end: 'in review',
    sentOn: '2026-10-12',
  },
  {
    code: '0012',
    title: 'Sight glass 80 × 12 mm, broke at pressure test',
    summary: 'Borosilicate sight glass broke at 3.38 MPa in the yearly pressure test.',
    kind: 'service part',
    urgency: 'urgent',
    organisation: 'Pellgrove Line Company',
    material: 'borosilicate glass BG-2',
    holder: glass,
    questions: ['What started the break?', 'Was the pressure within what the glass should carry?'],
    background: [
      {
        statement: 'Pressure at the break 3.38 MPa, read at the test pump.',
        standing: 'known',
        source: 'test protocol',
      },
      {
        statement: 'The cover was cleaned with a steel scraper in spring.',
        standing: 'told',
        source: 'Anselm Wyke, Pellgrove',
      },
    ],
    part: { description: 'Sight glass, 80 mm across, 12 mm thick', serial: 'SG-7', environment: 'water' },
    pieces: [
      { description: 'half with the origin, face A', massText: '71.3 g ± 0.1 g', place: 'cabinet C2' },
      { description: 'other half, face B', massText: '69.8 g ± 0.1 g', place: 'cabinet C2' },
    ],
    readings: [
      {
        figure: 2,
        by: glass,
        originCode: 'HD',
        certainty: 'certain',
        boundary: 'inner',
        place: 'surface',
        flawShape: 'half-ellipse',
        note: 'Impact scratch on the dry side',
      },
    ],
    estimates: [
      {
        reading: 0,
        mirror: { radiusPercent: 5 },
        flaw: { shapeFactor: '1.29', shapeFactorPercent: 6, sizePercent: 12 },
      },
    ],
    findings: {
      'What was asked': 'What started the break, and whether the pressure was within what the glass should carry.',
      'What came in': 'Two halves, nothing missing.',
      'What the surface shows':
        'An impact scratch on the dry side, with Wallner lines, mist and hackle leading back to it. {fig:2}',
      'Stress at the origin': 'The mirror gives {mirror}, the scratch {flaw}.',
      'Why it broke there': 'Compatible with a scratch made from outside, such as by a steel scraper.',
      'What else is at risk': 'Surviving twins cleaned the same way.',
      'What to do':
        'Release the pressure, isolate and look at the twins before they are used again; the responsible engineer decides.',
    },
    end: 'closed',
    sentOn: '2026-08-25',
    closedOn: '2026-08-28',
  },
];
