/** Answers that are figures: they may be shown anywhere and can do nothing. */
import { type Answer, cacheable } from './answer';
import { etagOf } from './etag';

/**
 * An SVG that is opened by itself is a page of this site: this policy lets it run nothing, fetch nothing and hold nothing but
 * its own styles and the font inside it.
 */
const NO_POWER = "default-src 'none'; style-src 'unsafe-inline'; font-src data:; img-src data:; sandbox";

/**
 * A figure under a file name. Its ETag is that of the SVG it is drawn from, so it changes with the drawing too; `value` makes
 * the bytes only if they are needed.
 */
export function figure<V>(svg: string, fileName: string, value: () => V | Promise<V>): Answer<V> {
  return cacheable({
    etag: etagOf(fileName, svg),
    value,
    headers: {
      'Content-Security-Policy': NO_POWER,
      'Content-Disposition': `inline; filename="${fileName}"`,
      'Cross-Origin-Resource-Policy': 'cross-origin',
    },
  });
}
