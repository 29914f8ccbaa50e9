import { useQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { mayInLaboratory } from '#shared/rules/may.ts';
import { caseChoices } from '#src/features/cases/api.ts';
import { Cautions } from '#src/features/cases/components/cautions.tsx';
import { OpenCaseForm } from '#src/features/cases/components/open-case-form.tsx';
import { usePerson } from '#src/http/session.ts';
import { ErrorState } from '#src/ui/error-state.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Note } from '#src/ui/note.tsx';
import { Page } from '#src/ui/page.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Spread } from '#src/ui/spread.tsx';

/** Takes in a new case, with the care its pieces need before they are touched. */
export function Component() {
  const person = usePerson();
  const navigate = useNavigate();
  const mayOpen = mayInLaboratory(person, 'open a case');
  const choices = useQuery({ ...caseChoices, enabled: mayOpen.allowed });
  const goTo = (number: string | null) => void navigate(number === null ? '/' : `/cases/${number}/intake`);
  return (
    <main id="content">
      <div className="px-edge pt-[14px]">
        <h1>Open a case</h1>
        <p className="lead">It gets the next number of the year and stands as received.</p>
      </div>
      <Spread>
        <Page label="What broke">
          {mayOpen.allowed ? null : <Note lead="A case is opened by an analyst.">{mayOpen.reason}</Note>}
          {choices.isError ? <ErrorState what="The form could not be prepared." why={choices.error.message} /> : null}
          {mayOpen.allowed && choices.isPending ? <LoadingState words="Preparing the form…" /> : null}
          {choices.data ? <OpenCaseForm choices={choices.data} onOpened={goTo} /> : null}
        </Page>
        <Page label="How to receive pieces">
          <RuleHead>When the pieces come</RuleHead>
          <ol className="prose-measure mb-6 list-decimal space-y-1 pl-5 !text-base/[1.45]">
            <li>Photograph the box, the packing and each piece as it came, before anything is moved.</li>
            <li>Count and weigh. Write down what is not there, and whether the origin may lie on it.</li>
            <li>Keep two parts apart. Never fit broken faces together; they rub away what they could tell.</li>
            <li>Each piece in its own box or bag, the fracture face touching nothing.</li>
            <li>Clean nothing until the faces have been looked at and photographed.</li>
          </ol>
          <Cautions words="glass vessel insulator hardmetal crown" />
        </Page>
      </Spread>
    </main>
  );
}
