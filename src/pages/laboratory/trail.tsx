import { useQuery } from '@tanstack/react-query';
import { AuditTrail } from '../../features/laboratory/components/audit-trail.tsx';
import { TrailCheckLine } from '../../features/laboratory/components/trail-check-line.tsx';
import { peopleQuery } from '../../features/people/api.ts';
import { Page } from '../../ui/page.tsx';
import { RuleHead } from '../../ui/rule-head.tsx';
import { Spread } from '../../ui/spread.tsx';

/** Who did what, when, newest first; and the check that the trail is what was written. */
export function Component() {
  const people = useQuery(peopleQuery);
  return (
    <Spread shape="single">
      <Page label="Audit trail" folio={{ chapter: 'iv', words: 'Audit trail', side: 'left' }}>
        <RuleHead level={2} aside="newest first, times in UTC; nothing is edited or removed">
          Audit trail
        </RuleHead>
        <TrailCheckLine />
        <AuditTrail people={people.data?.accounts ?? []} />
      </Page>
    </Spread>
  );
}
