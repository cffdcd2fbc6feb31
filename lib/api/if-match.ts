/** Versions as ETags: what a change starts from, so that nobody overwrites what they have not seen. */
import { AppError } from '@/lib/errors';

/** The ETag of a stored thing's version. */
export function versionTag(version: number): string {
  return `"v${version}"`;
}

/** The version that If-Match names. Throws `version-needed` without one, `version-lost` where it can be none of ours. */
export function versionIn(request: Request): number {
  const header = request.headers.get('if-match');
  if (header === null) throw new AppError('version-needed', 'The header If-Match is missing.');
  const version = /^\s*"v(\d{1,9})"\s*$/.exec(header)?.[1];
  if (version === undefined) throw new AppError('version-lost', `${header.slice(0, 40)} names no version of this.`);
  return Number(version);
}
