/** A moment in words, the same for every reader: in UTC, and said so. */
const FORMAT = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short', timeZone: 'UTC' });

/** `1 Dec 2026, 15:30 UTC`. */
export function MomentText({ at }: { readonly at: Date }) {
  return <time dateTime={at.toISOString()}>{FORMAT.format(at)} UTC</time>;
}
