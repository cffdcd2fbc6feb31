/** Shapes of what forms send about people and workspaces. */
import { z } from 'zod';
import { ROLES } from '@/db/schema';

const NAME_LENGTH_MAX = 80;

/** A name of a person or a workspace: one line, without what one cannot see. */
export const nameField = z
  .string()
  .trim()
  .min(1, 'Write a name.')
  .max(NAME_LENGTH_MAX, `A name has ${NAME_LENGTH_MAX} characters at most.`)
  .regex(/^[^\p{C}\p{Zl}\p{Zp}]*$/u, 'A name is one line of letters.');

export const roleField = z.enum(ROLES, 'Choose one of the roles.');

/** An id in a form. One that is none is refused like one that is nobody's. */
export const idField = z.uuid('There is nothing of this id.');
