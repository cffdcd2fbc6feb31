/** Messages to people: over SMTP where it is set, else into the local mailbox. */
import { createTransport } from 'nodemailer';
import type { Db } from '@/db/client';
import { insertMail } from '@/db/queries/mail';
import { env } from '@/lib/env';

/** A message in plain text, which every mail program shows. */
export interface Message {
  readonly to: string;
  readonly subject: string;
  /** A link stands in a paragraph of its own. */
  readonly paragraphs: readonly string[];
}

/** A form waits for the mail server; not for ever. */
const TIMEOUT_MS = 15_000;

/**
 * Sends a message. Throws where the mail server refuses it, without the address, which is for no log. Never inside a
 * transaction: it waits for the network.
 */
export async function sendMail(db: Db, { to, subject, paragraphs }: Message): Promise<void> {
  const text = `${paragraphs.join('\n\n')}\n`;
  if (env.smtpUrl === undefined) {
    await insertMail(db, { to, subject, text });
    return;
  }
  const timeouts = { connectionTimeout: TIMEOUT_MS, greetingTimeout: TIMEOUT_MS, socketTimeout: TIMEOUT_MS };
  const transport = createTransport({ url: env.smtpUrl, ...timeouts });
  await transport.sendMail({ from: env.mailFrom, to, subject, text }).catch((error: Error & { code?: string }) => {
    throw new Error(`the mail server took no message (${error.code ?? error.name})`);
  });
}
