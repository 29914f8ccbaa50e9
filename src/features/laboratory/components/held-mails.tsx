import { useInfiniteQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { EmptyState } from '#src/ui/empty-state.tsx';
import { ErrorState } from '#src/ui/error-state.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { heldMailsQuery, useLaboratoryActs } from '../api.ts';
import { MailAddress } from './mail-address.tsx';
import { OlderButton } from './older-button.tsx';
import { whenWords } from './when.ts';

/** The box on this machine: mails that would have gone out, to be opened one by one. */
export function HeldMails() {
  const query = useInfiniteQuery(heldMailsQuery);
  const { openHeld } = useLaboratoryActs();
  const [now] = useState(() => new Date());
  if (query.isPending) return <LoadingState words="Reading the box…" />;
  if (query.isError) return <ErrorState what="The box could not be read." why={query.error.message} />;
  const mails = query.data.pages.flatMap((page) => page.mails);
  if (mails.length === 0)
    return <EmptyState>With a mail server configured nothing is held here; without one, every mail is.</EmptyState>;
  const opened = openHeld.data;
  return (
    <>
      <Table caption="Mails held on this machine" stacked>
        <thead>
          <tr>
            <Th>Held</Th>
            <Th>To</Th>
            <Th>About</Th>
            <Th hidden>Acts</Th>
          </tr>
        </thead>
        <tbody>
          {mails.map((mail) => (
            <tr key={mail.id}>
              <td className="whitespace-nowrap text-ink-2">{whenWords(mail.heldAt, now)}</td>
              <td className="is-wide">
                <MailAddress address={mail.toMail} />
              </td>
              <td className="is-wide">{mail.subject}</td>
              <td className="num">
                <Button
                  kind="plain"
                  small
                  disabled={openHeld.isPending}
                  aria-label={`Open the mail to ${mail.toMail}`}
                  onClick={() => openHeld.mutate(mail.id)}
                >
                  Open
                </Button>
              </td>
            </tr>
          ))}
        </tbody>
      </Table>
      {openHeld.isError ? <FieldError id="held-error">{openHeld.error.message}</FieldError> : null}
      <OlderButton query={query} what="Older mails" />
      <p className="mt-3 text-s text-ink-2">
        A mail may carry a link meant for its reader alone. The audit trail says who opened it.
      </p>
      <Dialog
        wide
        open={Boolean(opened)}
        onOpenChange={() => openHeld.reset()}
        title={opened?.subject ?? ''}
        aside={opened?.toMail}
        acts={<Button onClick={() => openHeld.reset()}>Put it back</Button>}
      >
        <p className="mono text-s break-words whitespace-pre-wrap">{opened?.body}</p>
      </Dialog>
    </>
  );
}
