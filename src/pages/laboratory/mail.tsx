import { HeldMails } from '../../features/laboratory/components/held-mails.tsx';
import { OutgoingMails } from '../../features/laboratory/components/outgoing-mails.tsx';
import { Page } from '../../ui/page.tsx';
import { RuleHead } from '../../ui/rule-head.tsx';
import { Spread } from '../../ui/spread.tsx';

/** What has gone out at the left; at the right the box that holds mails where no mail server is configured. */
export function Component() {
  return (
    <Spread>
      <Page label="Outgoing mail" folio={{ chapter: 'iii', words: 'Outgoing mail', side: 'left' }}>
        <RuleHead level={2} aside="number, state and link only">
          Outgoing mail
        </RuleHead>
        <OutgoingMails />
      </Page>
      <Page label="Held on this machine" folio={{ chapter: 'iii', words: 'Held on this machine', side: 'right' }}>
        <RuleHead level={2} aside="while no mail server is configured">
          Held on this machine
        </RuleHead>
        <HeldMails />
      </Page>
    </Spread>
  );
}
