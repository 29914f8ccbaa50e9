import { barInputs } from './bar-inputs.ts';
import type { DemoCase } from './demo-case.ts';

const dental = 'analyst-dental@marrowdene.example';
const oxide = 'analyst-oxide@marrowdene.example';
const intake = 'intake@marrowdene.example';

export const serviceCases: readonly DemoCase[] = [
  {
    code: '0007',
    title: 'Zirconia crown, in three pieces',
    summary: 'Crown broke in use after chairside grinding; one piece is missing.',
    kind: 'service part',
    urgency: 'urgent',
    organisation: 'Cindermoor Dental Studio',
    material: 'dental zirconia Z-3',
    holder: dental,
    questions: ['What started the break?', 'Was it the material or what was done to it?'],
    background: [
      {
        statement: 'The inner side was ground at the chair to fit.',
        standing: 'told',
        source: 'Livia Tarn, Cindermoor',
      },
      { statement: 'Disc of lot LOT-Z.', standing: 'told', source: 'Livia Tarn, Cindermoor' },
      {
        statement: 'Disinfected before it was sent; replica taken first.',
        standing: 'known',
        source: 'receipt, intake',
      },
    ],
    part: { description: 'Molar crown', environment: 'body fluid' },
    pieces: [
      { description: 'inner wall with the origin', massText: '1.12 g ± 0.01 g', place: 'safe S2' },
      { description: 'opposite wall', massText: '0.96 g ± 0.01 g', place: 'safe S2' },
      { description: 'cusp', place: 'not found', missing: { reason: 'swallowed', originLies: 'no' } },
    ],
    readings: [
      {
        figure: 2,
        by: dental,
        originCode: 'MD',
        certainty: 'likely',
        boundary: 'outer',
        place: 'surface',
        flawShape: 'half-ellipse',
        note: 'Grinding cracks side by side',
      },
    ],
    estimates: [
      {
        reading: 0,
        mirror: { radiusPercent: 10 },
        flaw: { shapeFactor: '1.29', shapeFactorPercent: 8, sizePercent: 15 },
      },
    ],
    findings: {},
    end: 'examining',
  },
  {
    code: '0008',
    title: 'Porcelain post, broke at the foot under line pull',
    summary: 'Line post of 110 mm broke at the foot while the line was drawn in at 1800 N, arm 1.45 m.',
    kind: 'service part',
    urgency: 'exposed now',
    organisation: 'Pellgrove Line Company',
    material: 'electrical porcelain C-120',
    holder: oxide,
    questions: [
      'Where did the break start, and from what?',
      'What stress did the foot carry, and was that ordinary for such a post?',
      'Do the other thirteen posts of car C-31 hold the same flaw?',
    ],
    background: [
      {
        statement: 'The post broke at the foot while the line was drawn in; the dynamometer read 1800 N.',
        standing: 'known',
        source: 'site record',
      },
      {
        statement: 'Fired on kiln car C-31 with 13 others; all 14 shipped.',
        standing: 'told',
        source: 'Yevka Sorrel, Ostrevell',
      },
      { statement: 'The crate was not dropped.', standing: 'told', source: 'carrier, through Pellgrove' },
      {
        statement: 'The pull acted square to the post, within 10°.',
        standing: 'assumed',
        source: 'photograph from the site',
      },
    ],
    part: {
      description: 'Line post, 110 mm across',
      serial: 'C-31/06',
      maker: 'Ostrevell Ceramics',
      environment: 'air, outdoors',
    },
    pieces: [
      { description: 'foot and flange, face A', massText: '6.412 kg ± 0.005 kg', place: 'safe S2' },
      { description: 'upper length, face B', massText: '14.196 kg ± 0.005 kg', place: 'safe S2' },
      {
        description: 'slivers along the main crack',
        place: 'not found',
        missing: { reason: 'swept up with the yard', originLies: 'no' },
      },
    ],
    readings: [
      {
        figure: 1,
        by: oxide,
        originCode: 'CK',
        certainty: 'certain',
        place: 'surface',
        flawShape: 'half-ellipse',
        note: 'Firing crack, glazed over at its mouth',
      },
    ],
    estimates: [{ reading: 0, flaw: { shapeFactor: '1.26', shapeFactorPercent: 5, sizePercent: 15 } }],
    findings: {
      'What was asked':
        'Where the post broke from, what the foot carried, and whether the other posts of its car hold the same flaw.',
      'What came in': 'Foot and upper length. Slivers of the main crack are missing; the origin does not lie on them.',
      'What the surface shows':
        'A crack as deep as a thumb at the foot, glazed over at its mouth: it was there before the glaze was fired. The body is too coarse to show a mirror. {fig:1}',
      'Stress at the origin':
        'The crack, with the toughness of the body, gives {flaw}. No mirror boundary can be read, so no mirror line is drawn.',
      'Why it broke there': 'A firing crack. The stress it needed is about a sixth of what rods of the lot carry.',
      'What else is at risk': 'The other thirteen posts of car C-31.',
      'What to do': 'Find the thirteen posts; the responsible engineer decides on their use.',
    },
    end: 'closed',
    sentOn: '2026-08-11',
    closedOn: '2026-08-14',
  },
  {
    code: '0009',
    title: 'Hardmetal punch, broke after 40 000 strokes',
    summary: 'Punch broke at the shoulder; the press had been set higher the week before.',
    kind: 'service part',
    urgency: 'routine',
    organisation: 'Hexlund Tooling',
    material: 'hardmetal HM-10',
    holder: oxide,
    questions: ['Was the punch weak, or the load high?'],
    background: [
      {
        statement: 'Stress at the shoulder 2400 MPa by analysis of the press setting.',
        standing: 'told',
        source: 'analysis file from Hobart Lunde, Hexlund',
      },
      { statement: 'The press was set higher the week before.', standing: 'told', source: 'Hobart Lunde, Hexlund' },
    ],
    part: { description: 'Punch, 8 mm across', serial: 'HX-112', environment: 'oil' },
    pieces: [
      { description: 'shank with the origin', massText: '46.2 g ± 0.1 g', place: 'bench 1' },
      { description: 'tip', massText: '8.1 g ± 0.1 g', place: 'bench 1' },
    ],
    readings: [
      {
        figure: 2,
        by: oxide,
        originCode: 'P',
        certainty: 'certain',
        place: 'interior',
        flawShape: 'ellipse',
        note: 'Ordinary pore',
      },
    ],
    estimates: [{ reading: 0, flaw: { shapeFactor: '1.128', shapeFactorPercent: 8, sizePercent: 12 } }],
    findings: {
      'What was asked': 'Whether the punch was weak or the load high.',
      'What the surface shows': 'An ordinary pore a little below the surface of the shoulder. {fig:2}',
      'Stress at the origin': 'The pore, with the toughness of the grade, gives {flaw}.',
    },
    examinedOn: '2026-10-08',
    end: 'drafting',
  },
  {
    code: '0010',
    title: 'Bend bar A-05, tested at another house',
    summary: 'Bar of a good lot with a load that reads four times too low in the file that came with it.',
    kind: 'test specimen',
    urgency: 'routine',
    organisation: 'Ostrevell Ceramics',
    material: 'alumina AL-31',
    holder: oxide,
    questions: ['Why does the bar read so weak?'],
    background: [
      {
        statement: 'The file gives 88.35 as breaking load, without a unit.',
        standing: 'known',
        source: 'file of the test house',
      },
      { statement: 'Section 3.99 × 3.00 mm, spans 40 and 20 mm.', standing: 'told', source: 'test house' },
    ],
    part: {
      description: 'Bend bar A-05, 3 × 4 × 45 mm',
      serial: 'A-05',
      maker: 'Ostrevell Ceramics',
      environment: 'air',
    },
    pieces: [
      { description: 'left half, face A', massText: '1.03 g ± 0.01 g', place: 'bench 2, tray' },
      { description: 'right half, face B', massText: '1.04 g ± 0.01 g', place: 'bench 2, tray' },
    ],
    readings: [
      {
        figure: 2,
        by: oxide,
        originCode: 'P',
        certainty: 'certain',
        boundary: 'outer',
        place: 'surface',
        flawShape: 'half-ellipse',
      },
    ],
    estimates: [
      {
        reading: 0,
        load: { method: 'bend4.rect', inputs: barInputs({ loadN: 88.35, widthMm: 3.99, depthMm: 3 }) },
        mirror: { radiusPercent: 6 },
        flaw: { shapeFactor: '1.29', shapeFactorPercent: 6, sizePercent: 10 },
        remark: 'Load as the file has it, read as newtons',
      },
      {
        load: {
          method: 'bend4.rect',
          inputs: {
            ...barInputs({ loadN: 88.35, widthMm: 3.99, depthMm: 3 }),
            load: { text: '88.35 lbf', standardUncertainty: '1.73 %' },
          },
        },
        remark: 'Mirror and flaw both stand 4.4 to 4.5 times above the load line: the file is in pounds-force',
      },
    ],
    findings: {
      'What was asked': 'Why bar A-05 reads so weak.',
      'What the surface shows': 'An ordinary pore at the tensile surface. {fig:2}',
      'Stress at the origin':
        'The file gives its load without a unit. Read as newtons it stood at less than a quarter of mirror and flaw; read as pounds-force the bend test gives {load}, beside the mirror {mirror} and the flaw {flaw}.',
      'Why it broke there': 'At an ordinary stress for its lot. The bar was not weak; the number was in another unit.',
      'What to do': 'Tell the test house, and ask for the unit in every file.',
    },
    examinedOn: '2026-10-07',
    end: 'drafting',
  },
  {
    code: '0011',
    title: 'Kiln prop, found in two pieces',
    summary: 'Cordierite prop broke in the kiln; four faces were looked at and no origin was found.',
    kind: 'service part',
    urgency: 'routine',
    organisation: 'Ostrevell Ceramics',
    material: 'cordierite KP-1',
    holder: intake,
    questions: ['Why did the prop break?'],
    background: [
      {
        statement: 'Found broken when the kiln was unloaded.',
        standing: 'told',
        source: 'Yevka Sorrel, Ostrevell',
      },
      { statement: 'No load or temperature record was kept.', standing: 'known', source: 'kiln log' },
    ],
    part: { description: 'Kiln prop', maker: 'Ostrevell Ceramics', environment: 'air, to 1250 °C' },
    pieces: [
      { description: 'upper half', massText: '0.412 kg ± 0.001 kg', place: 'cabinet C1' },
      { description: 'lower half', massText: '0.388 kg ± 0.001 kg', place: 'cabinet C1' },
    ],
    readings: [],
    estimates: [],
    findings: {
      'What was asked': 'Why the prop broke.',
      'What came in': 'Two halves, nothing missing.',
      'What the surface shows':
        'Coarse and porous on all four faces looked at, by eye, stereo microscope and low-angle light. No origin was found, and none is named. {fig:1}',
      'Stress at the origin': 'Not estimated: without an origin there is no place to estimate it for.',
      'Why it broke there': 'Undetermined. Such a body often shows no origin.',
      'What else is at risk': 'Not known.',
      'What to do': 'Next time send all props of the same place in the kiln, with the temperature record, untouched.',
    },
    end: 'closed',
    sentOn: '2026-08-05',
    closedOn: '2026-08-07',
  },
];
