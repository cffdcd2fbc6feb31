/** The local mailbox: messages that would have been sent, where no mail server is set. */
import { index, pgTable, text } from 'drizzle-orm/pg-core';
import { id, moment, newestFirst } from './columns';

/** A message. The text and the HTML say the same. */
export const mail = pgTable(
  'mail',
  {
    id: id(),
    to: text('to').notNull(),
    subject: text('subject').notNull(),
    text: text('text').notNull(),
    html: text('html').notNull().default(''),
    at: moment('at').notNull().defaultNow(),
  },
  // The mailbox shows the newest first.
  (table) => [index('mail_at').on(newestFirst(table.at))],
);
