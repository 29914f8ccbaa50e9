import { useInfiniteQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { MailView } from '#shared/contracts/laboratory.ts';
import { Button } from '#src/ui/button.tsx';
import { EmptyState } from '#src/ui/empty-state.tsx';
import { ErrorState } from '#src/ui/error-state.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { mailsQuery, useLaboratoryActs } from '../api.ts';
import { MailAddress } from './mail-address.tsx';
import { OlderButton } from './older-button.tsx';
import { whenWords } from './when.ts';

/** The outbox: when, to whom, about what, and what became of it. */
export function OutgoingMails() {
  const query = useInfiniteQuery(mailsQuery);
  const { sendAgain } = useLaboratoryActs();
  const [now] = useState(() => new Date());
  if (query.isPending) return <LoadingState words="Reading the mail…" />;
  if (query.isError) return <ErrorState what="The mail could not be read." why={query.error.message} />;
  const mails = query.data.pages.flatMap((page) => page.mails);
  if (mails.length === 0) return <EmptyState>Invite someone, and the first mail stands here.</EmptyState>;
  return (
    <>
      <Table caption="Outgoing mail" stacked>
        <thead>
          <tr>
            <Th>Written</Th>
            <Th>To</Th>
            <Th>About</Th>
            <Th>What became of it</Th>
          </tr>
        </thead>
        <tbody>
          {mails.map((mail) => (
            <tr key={mail.id}>
              <td className="whitespace-nowrap text-ink-2">{whenWords(mail.writtenAt, now)}</td>
              <td className="is-wide">
                <MailAddress address={mail.toMail} />
              </td>
              <td className="is-wide">{mail.subject}</td>
              <td className="is-wide py-1">
                <MailFate mail={mail} />
                {mail.state === 'came back' ? (
                  <Button
                    kind="plain"
                    small
                    className="ml-2"
                    disabled={sendAgain.isPending}
                    onClick={() => sendAgain.mutate(mail.id)}
                  >
                    Send again
                  </Button>
                ) : null}
              </td>
            </tr>
          ))}
        </tbody>
      </Table>
      {sendAgain.isError ? <FieldError id="mail-error">{sendAgain.error.message}</FieldError> : null}
      <OlderButton query={query} what="Older mails" />
    </>
  );
}

function MailFate({ mail }: { mail: MailView }) {
  const tries = `${mail.tries} ${mail.tries === 1 ? 'try' : 'tries'}`;
  if (mail.state === 'gone') return <span>gone, once</span>;
  if (mail.state === 'came back')
    return (
      <span>
        <b className="text-iron">came back</b>, {tries}
        {mail.fault ? <span className="block text-s text-ink-2">{mail.fault}</span> : null}
      </span>
    );
  return (
    <span className="text-ink-2">
      waits{mail.tries > 0 ? `, ${tries}` : ''}
      {mail.fault ? <span className="block text-s">{mail.fault}</span> : null}
    </span>
  );
}
