import {
  enterInstrument,
  recordCalibration,
  replaceCalibration,
} from '../../features/laboratory/service/record-calibration.ts';
import { listInstruments, listKeptCalibrations } from '../../features/laboratory/service/find-calibrations.ts';
import { enterMaterial, listMaterials } from '../../features/materials/service/keep-material.ts';
import { recordConstant } from '../../features/materials/service/record-constant.ts';
import { admitPerson, enterOrganisation } from '../../features/people/service/admit-person.ts';
import { findOpenPerson } from '../../features/people/service/find-settings.ts';
import { listAccounts } from '../../features/people/service/list-people.ts';
import {
  demoCalibrations,
  demoExpandedUncertaintyPercent,
  demoInstruments,
  demoReplacement,
  type DemoCalibrationCode,
} from './calibrations.ts';
import type { Hands } from './hands.ts';
import { demoConstantSource, demoMaterials } from './materials.ts';
import { demoOrganisations, demoPassword, demoPeople } from './people.ts';

const engineer = 'lot-engineer-2@marrowdene.example';
const keeper = 'second-reader@marrowdene.example';
const foundedOn = '2026-04-20';
const stageScale = 'stage scale SM-2, read against its certificate';

/** Enters the organisations and admits everyone; who is there already is left as they are. */
export async function foundLaboratory(hands: Hands): Promise<void> {
  const { visitor } = hands;
  hands.clock.set(foundedOn, '08:00');
  const { organisations, accounts } = await listAccounts(visitor);
  const ids = new Map<string, string>(organisations.map(({ name, id }) => [name, id]));
  for (const organisation of demoOrganisations) {
    if (ids.has(organisation.name)) continue;
    ids.set(organisation.name, (await enterOrganisation(visitor, organisation)).id);
  }
  const there = new Set(accounts.map(({ mail }) => mail));
  for (const { mail, name, organisation, roles } of demoPeople) {
    if (there.has(mail)) continue;
    hands.clock.passMinutes(1);
    const organisationId = ids.get(organisation) ?? organisation;
    await admitPerson(visitor, { mail, name, organisationId, roles, password: demoPassword });
  }
  for (const account of (await listAccounts(visitor)).accounts) {
    const person = await findOpenPerson(visitor, account.id);
    if (person) hands.admit(person);
  }
}

/** Enters the materials with their constants, which hold for the demo only. */
export async function enterMaterials(hands: Hands): Promise<void> {
  hands.clock.set('2026-04-21', '09:00');
  for (const { name, family, route, constants } of demoMaterials) {
    const entered = { name, family, route, grainSizeUm: null, note: null };
    await hands.once(`enter ${name}`, engineer, (context) => enterMaterial(context, entered));
    const material = (await listMaterials(hands.visitor.reader)).find((each) => each.name === name);
    if (!material) throw new Error(`${name} was not entered`);
    for (const { kind, value, expandedUncertainty } of constants)
      await hands.once(`record ${kind} of ${name}`, engineer, (context) =>
        recordConstant(context, material.id, {
          ...{ kind, value, plusMinus: expandedUncertainty, plusMinusIs: 'U', source: demoConstantSource },
          ...{ sourceStanding: 'assumed', condition: null, validFrom: foundedOn, reason: null, replaces: null },
        }),
      );
  }
}

/** Enters the instruments and their scales. `pixelFactor`: see DemoViews. */
export async function enterScales(hands: Hands, pixelFactor: number): Promise<void> {
  hands.clock.set('2026-04-22', '09:00');
  for (const instrument of demoInstruments)
    await hands.once(`enter ${instrument.name}`, keeper, (context) => enterInstrument(context, instrument));
  const instruments = await listInstruments(hands.visitor.reader);
  for (const { code, instrument, setting, pixelSizeUm, asFoundErrorPercent } of demoCalibrations)
    await hands.once(`record ${code}`, keeper, (context) =>
      recordCalibration(context, {
        instrumentId: instruments.find(({ name }) => name === instrument)?.id ?? instrument,
        ...{ setting, way: 'graticule', pixelSizeXUm: pixelSizeUm * pixelFactor, source: stageScale },
        ...{ expandedUncertaintyPercent: demoExpandedUncertaintyPercent, asFoundErrorPercent, validFrom: foundedOn },
      }),
    );
}

/** Puts the right scale in place of the one found out; all that was read with it turns stale. */
export async function replaceScale(hands: Hands, pixelFactor: number): Promise<void> {
  const old = await findCalibration(hands, demoReplacement.code);
  const { setting } = demoCalibrations.find(({ code }) => code === demoReplacement.code) ?? { setting: '' };
  await hands.once('replace CAL-06', keeper, (context) =>
    replaceCalibration(context, old.id, {
      ...{ setting, way: 'graticule', pixelSizeXUm: demoReplacement.pixelSizeUm * pixelFactor },
      source: 'stage scale SM-3, certificate of October 2026',
      ...{ expandedUncertaintyPercent: demoExpandedUncertaintyPercent, validFrom: demoReplacement.on },
      ...{ asFoundErrorPercent: demoReplacement.asFoundErrorPercent, reason: demoReplacement.reason },
    }),
  );
}

/** A calibration of the demo as it is kept, or the one that has taken its place. */
export async function findCalibration(hands: Hands, code: DemoCalibrationCode, inForce = false) {
  const rows = await listKeptCalibrations(hands.visitor.reader);
  const row = rows.find((each) => each.calibration.code === code);
  if (!row) throw new Error(`${code} is not kept`);
  const id = inForce ? (row.replacedById ?? row.calibration.id) : row.calibration.id;
  return { id, instrument: row.instrument, setting: row.calibration.setting };
}
