/** Addresses of people: one form by which the same address is found again, whatever dress it comes in. */
import { AppError } from './errors';

const LENGTH_MAX = 254;
/** RFC 5321 in its everyday part: no quotes, no comments, no address literals. */
const ADDRESS = /^[a-z0-9.!#$%&'*+/=?^_`{|}~-]{1,64}@(?:[a-z0-9](?:[a-z0-9-]{0,61}[a-z0-9])?\.)+[a-z]{2,63}$/;

/**
 * The form that is unique: NFKC and lower case, as full-width letters and odd case are the same address. What is
 * still not plain ASCII then is refused: letters of other scripts that look alike would make two people look like one.
 */
export function emailKeyOf(text: string): string {
  const key = text.trim().normalize('NFKC').toLowerCase();
  if (key.length <= LENGTH_MAX && ADDRESS.test(key)) return key;
  const message = 'Write an e-mail address in plain letters, as in name@example.org.';
  throw new AppError('invalid-request', message, { faults: [{ path: '/email', code: 'no-address', message }] });
}
