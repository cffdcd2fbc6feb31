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

/** Sends a message. Throws where the mail server refuses it. Never inside a transaction: it waits for the network. */
export async function sendMail(db: Db, { to, subject, paragraphs }: Message): Promise<void> {
  const text = `${paragraphs.join('\n\n')}\n`;
  if (env.smtpUrl === undefined) await insertMail(db, { to, subject, text });
  else await createTransport(env.smtpUrl).sendMail({ from: env.mailFrom, to, subject, text });
}
