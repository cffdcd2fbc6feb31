/** The reference: a list of calls at the side, then call by call what it takes, answers and refuses. */
import { type DocumentLike, type Operation, operationsByTag } from './operations';

/** All calls of a document. */
export function Reference({ document }: { readonly document: DocumentLike }) {
  const groups = operationsByTag(document);
  return (
    <div className="mt-8 grid grid-cols-[minmax(0,1fr)] gap-x-12 gap-y-10 lg:grid-cols-[220px_minmax(0,1fr)]">
      <nav aria-label="Calls" className="text-[14px]">
        {groups.map(({ name, operations }) => (
          <div key={name} className="mb-4">
            <h2>{name}</h2>
            <ul>
              {operations.map(({ id, summary }) => (
                <li key={id}>
                  <a href={`#${id}`} className="block py-1 hover:underline">
                    {summary}
                  </a>
                </li>
              ))}
            </ul>
          </div>
        ))}
      </nav>
      <div>
        {groups.map(({ name, about, operations }) => (
          <section key={name} aria-label={name} className="mb-12">
            <p className="border-b border-ink pb-1 text-[20px] font-bold">{name}</p>
            <p className="mt-1 text-soft">{about}</p>
            {operations.map((operation) => (
              <Call key={operation.id} operation={operation} />
            ))}
          </section>
        ))}
      </div>
    </div>
  );
}

function Call({ operation }: { readonly operation: Operation }) {
  const { id, method, path, summary, about, access, parameters, body, answers } = operation;
  return (
    <article id={id} className="mt-8 border-t border-rule pt-4" aria-labelledby={`${id}-name`}>
      <h3 id={`${id}-name`} className="text-[16px] font-bold">
        {summary}
      </h3>
      <p className="mt-1 font-bold break-all">
        <code>
          {method} {path}
        </code>
      </p>
      <p className="mt-2 max-w-160">{about}</p>
      <p className="mt-1 max-w-160 text-soft">Who may call: {access}.</p>
      {parameters.length > 0 && (
        <Table
          caption="Parameters"
          heads={['Name', 'In', 'Type', 'What it is']}
          rows={parameters.map((each) => [
            each.required ? `${each.name} (needed)` : each.name,
            each.place,
            each.type,
            each.about,
          ])}
        />
      )}
      {body && (
        <>
          <p className="mt-4">
            <b>Body:</b> {body.shape}. {body.about}
          </p>
          <pre tabIndex={0} className="mt-2 overflow-x-auto border border-rule bg-raise p-3 text-[13px] leading-5">
            {body.example}
          </pre>
        </>
      )}
      <Table
        caption="Answers"
        heads={['Status', 'Shape', 'When']}
        rows={answers.map((each) => [each.status, each.shape, each.about])}
      />
    </article>
  );
}

function Table({
  caption,
  heads,
  rows,
}: {
  readonly caption: string;
  readonly heads: readonly string[];
  readonly rows: readonly (readonly string[])[];
}) {
  return (
    <div className="mt-4 overflow-x-auto" tabIndex={0} role="region" aria-label={caption}>
      <table className="w-full border-collapse text-[14px]">
        <caption className="text-left font-bold">{caption}</caption>
        <thead>
          <tr>
            {heads.map((head) => (
              <th key={head} scope="col" className="border-b border-hair py-1 pr-4 text-left font-normal text-soft">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.join(' ')} className="align-top">
              {row.map((cell, place) => (
                <td key={heads[place]} className="border-b border-rule py-1 pr-4">
                  {cell}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
