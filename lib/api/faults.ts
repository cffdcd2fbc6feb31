/** What zod found, in the words of a problem: one fault a place, each with a JSON pointer. */
import type { z } from 'zod';
import type { ProblemFault } from '@/openapi/schemas/problem';

type Place = ProblemFault['in'];
type Issue = z.core.$ZodIssue;

/** The faults of one part of a request, in the order of the schema. */
export function faultsOf(error: z.ZodError, place: Place): ProblemFault[] {
  return error.issues.flatMap((issue) => fromIssue(issue, place));
}

/** JSON pointer (RFC 6901) of a path: `~` and `/` inside a name are escaped. */
export function pointer(path: readonly PropertyKey[]): string {
  return path.map((step) => `/${String(step).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');
}

function fromIssue(issue: Issue, place: Place): ProblemFault[] {
  const path = pointer(issue.path);
  const fault = (code: string, message: string): ProblemFault[] => [{ in: place, path, code, message }];
  switch (issue.code) {
    case 'unrecognized_keys':
      return issue.keys.map((key) => ({
        in: place,
        path: pointer([...issue.path, key]),
        code: 'unknown-field',
        message: 'There is no such field in this call.',
      }));
    case 'invalid_type':
      if (isMissing(issue)) return fault('required', `This ${expectedWord(issue.expected)} is needed and missing.`);
      return fault('wrong-type', `This must be ${withArticle(expectedWord(issue.expected))}.`);
    case 'invalid_value':
      return fault('not-a-choice', `This must be one of: ${listed(issue.values)}.`);
    case 'too_big':
      return fault('too-large', `At most ${issue.maximum}${unitOf(issue.origin)}.`);
    case 'too_small':
      return fault('too-small', `At least ${issue.minimum}${unitOf(issue.origin)}.`);
    default:
      return fault('invalid', 'This value does not have the promised shape.');
  }
}

/** zod says of a missing field that it received undefined, in its sentence only. */
function isMissing(issue: Issue): boolean {
  return issue.message.endsWith('received undefined');
}

const WORDS: Readonly<Record<string, string>> = { int: 'whole number', array: 'list', object: 'object' };

function expectedWord(expected: string): string {
  return WORDS[expected] ?? expected;
}

function withArticle(word: string): string {
  return /^[aeiou]/.test(word) ? `an ${word}` : `a ${word}`;
}

/** Choices are listed in full up to a dozen: more would bury the sentence. */
function listed(values: readonly unknown[]): string {
  const shown = values.slice(0, 12).map((value) => JSON.stringify(value));
  return values.length > shown.length ? `${shown.join(', ')} and others` : shown.join(', ');
}

function unitOf(origin: string): string {
  if (origin === 'string') return ' characters';
  return origin === 'array' ? ' entries' : '';
}
