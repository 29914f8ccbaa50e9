import { Asked } from '#src/features/cases/components/asked.tsx';
import { Background } from '#src/features/cases/components/background.tsx';
import { Cautions } from '#src/features/cases/components/cautions.tsx';
import { ExposedFlag } from '#src/features/cases/components/exposed-flag.tsx';
import { Happened } from '#src/features/cases/components/happened.tsx';
import { History } from '#src/features/cases/components/history.tsx';
import { Parties } from '#src/features/cases/components/parties.tsx';
import { usePerson } from '#src/http/session.ts';
import { Page } from '#src/ui/page.tsx';
import { Spread } from '#src/ui/spread.tsx';
import { useCase } from './case-context.ts';

/** Chapter i: what was asked of the case, by whom, and what is known before anything is looked at. */
export function Component() {
  const { case: view, acts } = useCase();
  const person = usePerson();
  return (
    <Spread>
      <Page label="What was asked" folio={{ chapter: 'i', words: 'What was asked', side: 'left' }}>
        {view.urgency === 'exposed now' ? <ExposedFlag /> : null}
        <div className="grid gap-4 pb-4">
          <Asked number={view.number} mayEdit={acts.edit} />
          <Happened view={view} mayEdit={acts.edit} />
          <Parties view={view} laboratory={person.organisationName} />
          <Cautions words={`${view.title} ${view.summary} ${view.material?.name ?? ''}`} />
        </div>
      </Page>
      <Page label="What is known" folio={{ chapter: 'i', words: 'What is known', side: 'right' }}>
        <div className="grid gap-6 pb-4">
          <Background number={view.number} mayEdit={acts.edit} year={new Date(view.asOf).getUTCFullYear()} />
          <History number={view.number} />
        </div>
      </Page>
    </Spread>
  );
}
