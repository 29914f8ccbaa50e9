import { createTransport } from 'nodemailer';
import type { Transaction } from '../database/connection.ts';
import { insertHeld, type OutgoingRow } from './queries.ts';

export type MailSettings = {
  /** The mail server; without one, messages are held on this machine. */
  readonly smtpUrl?: string;
  readonly mailFrom: string;
  /** Where the pages of this installation are, without a slash at the end; the start of every link. */
  readonly address: string;
};

/** Carries one message away. @throws Error with the mail server's words; `responseCode` of 500 and more is final. */
export type Post = (tx: Transaction, mail: OutgoingRow) => Promise<void>;

/** The way out: the mail server of the settings or, without one, the box on this machine. */
export function postFor(settings: MailSettings): Post {
  return settings.smtpUrl ? smtpPost(settings.smtpUrl, settings) : boxPost(settings);
}

function smtpPost(url: string, settings: MailSettings): Post {
  const address = new URL(url);
  const transport = createTransport({
    host: address.hostname,
    port: address.port ? Number(address.port) : undefined,
    secure: address.protocol === 'smtps:',
    ignoreTLS: address.searchParams.get('ignoreTLS') === 'true',
    ...(address.username
      ? { auth: { user: decodeURIComponent(address.username), pass: decodeURIComponent(address.password) } }
      : {}),
    // A silent server must not hold a connection to the database for long.
    connectionTimeout: 10_000,
    greetingTimeout: 10_000,
    socketTimeout: 20_000,
  });
  return async (_tx, mail) => {
    await transport.sendMail({
      from: settings.mailFrom,
      to: { name: '', address: mail.toMail },
      subject: mail.subject,
      text: wholeText(mail, settings),
      date: mail.writtenAt,
      // The same at every try: whoever gets it twice, after a crash between sending and noting it, can tell.
      messageId: `<${mail.id}@${hostOf(settings.mailFrom)}>`,
    });
  };
}

function boxPost(settings: MailSettings): Post {
  return (tx, mail) =>
    insertHeld(tx, {
      id: mail.id,
      toMail: mail.toMail,
      subject: mail.subject,
      body: wholeText(mail, settings),
      heldAt: tx.at,
    });
}

function wholeText({ body, link }: OutgoingRow, { address }: MailSettings): string {
  return link ? `${body}\n\n${address.replace(/\/$/, '')}${link}\n` : `${body}\n`;
}

function hostOf(mailFrom: string): string {
  return /@([\w.-]+)/.exec(mailFrom)?.[1] ?? 'hacklebook.invalid';
}
