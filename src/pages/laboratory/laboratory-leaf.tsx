import { useQuery } from '@tanstack/react-query';
import { NavLink, Outlet, useMatch } from 'react-router-dom';
import { mayInLaboratory } from '#shared/rules/may.ts';
import { laboratoryQuery } from '../../features/laboratory/api.ts';
import { usePerson } from '../../http/session.ts';
import { ButtonLink } from '../../ui/button-link.tsx';
import { Chapters, ChapterWords } from '../../ui/chapters.tsx';
import { EmptyState } from '../../ui/empty-state.tsx';

/** The place where an administrator keeps people, mail and trail: its head and its chapters. */
export function Component() {
  const person = usePerson();
  const allowed = mayInLaboratory(person, 'keep people');
  const isAtInstruments = useMatch('/laboratory/instruments') !== null;
  if (allowed.allowed) return <Leaf />;
  // Instruments and their scales are open to all of the laboratory's own people.
  if (isAtInstruments && mayInLaboratory(person, 'read calibrations').allowed) return <InstrumentsLeaf />;
  return <NotForYou reason={allowed.reason} />;
}

function Leaf() {
  const { data } = useQuery(laboratoryQuery);
  return (
    <main id="content">
      <div className="case-head">
        <div>
          <span className="mb-1 block min-h-[21px] text-m text-ink-2">{data?.name}</span>
          <h1>Laboratory</h1>
        </div>
      </div>
      <Chapters label="Chapters of the laboratory">
        <NavLink to="people">
          <ChapterWords numeral="i" words="People" />
        </NavLink>
        <NavLink to="instruments">
          <ChapterWords numeral="ii" words="Instruments" />
        </NavLink>
        <NavLink to="mail">
          <ChapterWords
            numeral="iii"
            words="Outgoing mail"
            stale
            remark={data && data.cameBack > 0 ? `${data.cameBack} came back` : null}
          />
        </NavLink>
        <NavLink to="trail">
          <ChapterWords numeral="iv" words="Audit trail" remark={data?.trailEntries.toLocaleString('en-GB')} />
        </NavLink>
      </Chapters>
      <Outlet />
    </main>
  );
}

function InstrumentsLeaf() {
  const { organisationName } = usePerson();
  return (
    <main id="content">
      <div className="case-head">
        <div>
          <span className="mb-1 block min-h-[21px] text-m text-ink-2">{organisationName}</span>
          <h1>Laboratory</h1>
        </div>
      </div>
      <Chapters label="Chapters of the laboratory">
        <NavLink to="instruments">
          <ChapterWords numeral="ii" words="Instruments" />
        </NavLink>
      </Chapters>
      <Outlet />
    </main>
  );
}

function NotForYou({ reason }: { reason: string }) {
  return (
    <main id="content" className="mx-auto mt-10 max-w-[640px]">
      <EmptyState
        title="The laboratory is kept by its administrators"
        acts={<ButtonLink to="/">Go to the first page</ButtonLink>}
      >
        {reason} Ask an administrator if you need someone invited or an account changed.
      </EmptyState>
    </main>
  );
}
