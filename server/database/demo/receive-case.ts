import { readEvidence } from '../../features/evidence/service/read-evidence.ts';
import { enterPart } from '../../features/evidence/service/enter-part.ts';
import { noteMissing } from '../../features/evidence/service/note-missing.ts';
import { pairFaces } from '../../features/evidence/service/pair-faces.ts';
import { receivePiece } from '../../features/evidence/service/receive-piece.ts';
import { addStatement } from '../../features/cases/service/keep-background.ts';
import { takeCase } from '../../features/cases/service/give-case.ts';
import { moveCaseByHand } from '../../features/cases/service/move-case.ts';
import { openNewCase } from '../../features/cases/service/open-a-case.ts';
import { listMaterials } from '../../features/materials/service/keep-material.ts';
import { listEnteredOrganisations } from '../../features/people/service/list-people.ts';
import type { DemoCase, DemoPiece } from './demo-case.ts';
import type { Hands } from './hands.ts';

const intake = 'intake@marrowdene.example';

/** The desk: opens the case with its questions, enters what broke and receives every piece. */
export async function receiveCase(hands: Hands, told: DemoCase, day: string): Promise<void> {
  const { reader } = hands.visitor;
  const organisation = (await listEnteredOrganisations({ reader })).find(({ name }) => name === told.organisation);
  const material = (await listMaterials(reader)).find(({ name }) => name === told.material);
  if (!organisation || !material) throw new Error(`${told.code} names an organisation or material not entered`);
  const { title, summary, kind, urgency } = told;
  const questions = told.questions.map((text, index) => ({ key: `q${index + 1}`, text }));
  const asked = { title, summary, kind, urgency, questions, organisationId: organisation.id, materialId: material.id };
  await hands.once(`${told.code} open`, intake, (context) => openNewCase(context, asked));
  const { description, serial = null, maker = null, environment = null } = told.part;
  const unknown = { drawing: null, temperatureC: null, serviceTime: null };
  const part = { description, serial, maker, environment, ...unknown, materialId: material.id };
  const inEvidence = { by: intake, code: told.code, act: 'change evidence' } as const;
  await hands.onceIn({ ...inEvidence, name: 'part' }, (context, heldCase) => enterPart(context, heldCase, part));
  const { parts } = await readEvidence(hands.reading(intake), await hands.look(told.code, intake));
  for (const piece of told.pieces) await receiveOne(hands, told, { piece, partId: parts[0]?.id ?? '', day });
  await pairHalves(hands, told);
}

async function receiveOne(
  hands: Hands,
  told: DemoCase,
  { piece, partId, day }: { piece: DemoPiece; partId: string; day: string },
): Promise<void> {
  const { description, massText = null, place, missing } = piece;
  const inEvidence = { by: intake, code: told.code, act: 'change evidence', name: `piece ${description}` } as const;
  await hands.onceIn(inEvidence, (context, heldCase) =>
    missing
      ? noteMissing(context, heldCase, {
          partId,
          description,
          missingReason: missing.reason,
          originLies: missing.originLies,
        })
      : receivePiece(context, heldCase, {
          ...{ partId, description, place, mass: massText, condition: 'as received, not cleaned', receivedOn: day },
          ...{ parentId: null, way: 'break', holder: hands.person(intake).name },
        }),
  );
}

/** Face A of the first piece lay against face B of the second. */
async function pairHalves(hands: Hands, told: DemoCase): Promise<void> {
  const { pieces } = await readEvidence(hands.reading(intake), await hands.look(told.code, intake));
  const [one, other] = ['F1', 'F2'].map((code) => pieces.find((piece) => piece.code === code));
  if (!one || !other) return;
  const faces = { one: { fragmentId: one.id, face: 'A' }, other: { fragmentId: other.id, face: 'B' } } as const;
  const pairing = { by: intake, code: told.code, act: 'change evidence', name: 'mates' } as const;
  await hands.onceIn(pairing, (context, heldCase) => pairFaces(context, heldCase, { ...faces, crack: 'main crack' }));
}

/** The analyst takes the case, writes down what is known, told and assumed, and begins to examine. */
export async function takeUpCase(hands: Hands, told: DemoCase, day: string): Promise<void> {
  const by = told.holder;
  const { code } = told;
  await hands.onceIn({ name: 'take', by, code, act: 'take' }, (context, heldCase) =>
    takeCase(context, heldCase, { versionSeen: heldCase.version }),
  );
  for (const { statement, standing, source } of told.background)
    await hands.onceIn({ name: `background ${statement}`, by, code, act: 'edit' }, (context, heldCase) =>
      addStatement(context, heldCase, { statement, standing, source, givenOn: day }),
    );
  await moveOn(hands, told, 'examining');
}

export function moveOn(hands: Hands, { code, holder }: DemoCase, to: 'examining' | 'drafting'): Promise<void> {
  return hands.onceIn({ name: to, by: holder, code, act: 'move' }, (context, heldCase) =>
    moveCaseByHand(context, heldCase, { to, versionSeen: heldCase.version }),
  );
}
