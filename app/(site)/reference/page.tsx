/** The reference of the API, drawn from the same document that the API serves; nothing is fetched from elsewhere. */
import type { Metadata } from 'next';
import { Reference } from '@/components/views/reference/reference';
import { apiDocument } from '@/openapi/document';

export const metadata: Metadata = {
  title: 'API reference',
  description: 'Every call of the Waypost API: what it takes, what it answers, what it can refuse.',
};

export default function ReferencePage() {
  return (
    <div className="page-measure py-6 md:py-8">
      <h1>API reference</h1>
      <p className="mt-1 max-w-160 text-soft">
        Every call under <code>/api/v1</code>, from the same document that programs read:{' '}
        <a className="underlined" href="/api/v1/openapi.json">
          openapi.json
        </a>
        . Computing calls need no key; what is stored needs one, sent as <code>Authorization: Bearer …</code>, made by
        an owner on the page Keys.
      </p>
      <Reference document={apiDocument()} />
    </div>
  );
}
