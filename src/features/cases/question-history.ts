import type { Question, QuestionsView } from '#shared/contracts/cases.ts';

export type QuestionShown = Question & {
  /** The version in which it came to read as it does. */
  readonly since: number;
  /** How it read before that; absent where it was new then. */
  readonly before: string | null;
  /** Why it was changed in that version, and by whom. */
  readonly changedIn: QuestionsView | null;
};

/** The newest questions, each with the version it reads so since and the wording it replaced. `versions`: newest first. */
export function questionsShown(versions: readonly QuestionsView[]): QuestionShown[] {
  const [newest, ...earlier] = versions;
  return (newest?.questions ?? []).map((question) => {
    const textIn = (version: QuestionsView) => version.questions.find(({ key }) => key === question.key)?.text ?? null;
    const changedAt = earlier.findIndex((version) => textIn(version) !== question.text);
    const since = versions[changedAt === -1 ? versions.length - 1 : changedAt];
    const before = changedAt === -1 ? null : textIn(earlier[changedAt]);
    return { ...question, since: since.version, before, changedIn: before === null ? null : since };
  });
}

/** Questions that stood in the version before the newest and were taken out of it. */
export function questionsTakenOut([newest, before]: readonly QuestionsView[]): Question[] {
  if (!newest || !before) return [];
  return before.questions.filter(({ key }) => !newest.questions.some((question) => question.key === key));
}
