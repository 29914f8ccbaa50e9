import type { SignatureMeaning } from '#shared/vocabulary/signatures.ts';
import { acceptNote } from '../../features/closure/service/accept-note.ts';
import { loadReview } from '../../features/closure/service/load-review.ts';
import { sendToReview } from '../../features/closure/service/send-to-review.ts';
import { signCase } from '../../features/closure/service/sign-case.ts';
import type { DemoCase } from './demo-case.ts';
import type { Hands } from './hands.ts';
import { demoPassword, type DemoMail } from './people.ts';

const manager = 'laboratory-manager@marrowdene.example';
const thisMachine = '127.0.0.1';

/** The analyst sends the case to review and signs it as authored. */
export async function sendDemoCase(hands: Hands, told: DemoCase): Promise<void> {
  const { code, holder: by } = told;
  await hands.onceIn({ name: 'send', by, code, act: 'send to review' }, (context, heldCase) =>
    sendToReview(context, heldCase),
  );
  await sign(hands, told, by, 'authored');
}

/** A manager reads the case, lets what is noted stand with a reason, and signs it as approved, which seals it. */
export async function closeDemoCase(hands: Hands, told: DemoCase): Promise<void> {
  const { code } = told;
  const { readiness } = await loadReview(hands.reading(manager), await hands.look(code, manager));
  for (const point of readiness.filter(({ kind, accepted }) => kind === 'note' && accepted === null)) {
    const reason = reasons[point.code] ?? 'Read, and said in the findings.';
    const accepting = { name: `accept ${point.sentence}`, by: manager, code, act: 'accept a note' } as const;
    await hands.onceIn(accepting, (context, heldCase) =>
      acceptNote(context, heldCase, { note: point.sentence, reason }),
    );
  }
  await sign(hands, told, manager, 'approved');
}

const reasons: Readonly<Record<string, string>> = {
  'one-line': 'The body is too coarse to show a mirror; the findings say that one line stands alone.',
  'no-estimate': 'Without an origin there is no place to estimate a stress for; the findings say so.',
  'no-origin': 'Four faces were looked at in three ways. Not finding an origin is the finding.',
};

function sign(hands: Hands, { code }: DemoCase, by: DemoMail, meaning: SignatureMeaning): Promise<void> {
  return hands.onceIn({ name: `sign ${meaning}`, by, code, act: 'read' }, async (context, heldCase) => {
    const { contentHash } = await loadReview(hands.reading(by), heldCase);
    if (contentHash === null) throw new Error(`${code} is not in review`);
    await signCase(context, heldCase, { meaning, password: demoPassword, contentHash }, thisMachine);
  });
}
