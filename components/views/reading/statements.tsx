/** The statements of a reading in three columns, each a link to itself that points at its squares. */
import { memo } from 'react';
import type { Reading, Statement } from '@/engine/reading/schema';
import type { SquareName, Theme } from '@/engine/types';

const COLUMNS: readonly { readonly title: string; readonly themes: readonly Theme[] }[] = [
  { title: 'Squares and outposts', themes: ['squares', 'outposts', 'control'] },
  { title: 'Pawns and files', themes: ['structure', 'files'] },
  { title: 'Men and kings', themes: ['men', 'king'] },
];

/** Statements of a column that are shown at once; the rest unfold. */
const SHOWN_MAX = 8;

export interface StatementsProps {
  readonly reading: Reading;
  /** Numbers that stand on the plate, by statement key. */
  readonly numbers: ReadonlyMap<string, number>;
  readonly chosen: string | null;
  /** A square that is pointed at: its statements stand out. */
  readonly square: SquareName | null;
  readonly hrefOf: (key: string) => string;
  readonly onPoint?: (key: string | null) => void;
  readonly onChoose?: (key: string) => void;
}

/** The list of statements. */
export const Statements = memo((props: StatementsProps) => {
  return (
    <div className="grid gap-x-10 gap-y-8 md:grid-cols-2 lg:grid-cols-3">
      {COLUMNS.map(({ title, themes }) => {
        const list = props.reading.statements.filter(({ theme }) => themes.includes(theme));
        return (
          <section key={title} aria-label={title}>
            <h2 className="border-b border-rule pb-2">{title}</h2>
            {list.length === 0 ? <p className="py-3 text-soft">Nothing to say here.</p> : null}
            <Items {...props} list={list.slice(0, SHOWN_MAX)} />
            {list.length > SHOWN_MAX ? (
              <details open={list.slice(SHOWN_MAX).some(({ key }) => key === props.chosen) || undefined}>
                <summary className="min-h-11 cursor-pointer py-2.5 text-soft hover:text-ink">
                  {list.length - SHOWN_MAX} more
                </summary>
                <Items {...props} list={list.slice(SHOWN_MAX)} />
              </details>
            ) : null}
          </section>
        );
      })}
    </div>
  );
});
Statements.displayName = 'Statements';

function Items({ list, ...props }: StatementsProps & { readonly list: readonly Statement[] }) {
  return (
    <ul>
      {list.map((statement) => (
        <Item key={statement.key} statement={statement} {...props} />
      ))}
    </ul>
  );
}

function Item({
  statement,
  numbers,
  chosen,
  square,
  hrefOf,
  onPoint,
  onChoose,
}: Omit<StatementsProps, 'reading'> & { readonly statement: Statement }) {
  const { key, head, text, side, squares, men } = statement;
  const isChosen = key === chosen;
  const points = square !== null && (squares.includes(square) || men.includes(square));
  const ink = side === 'white' ? 'text-ochre' : side === 'black' ? 'text-indigo' : 'text-ink';
  const mark = isChosen ? 'border-l-pick' : points ? 'border-l-ink' : 'border-l-transparent';
  return (
    <li className="border-b border-rule">
      <a
        href={hrefOf(key)}
        aria-current={isChosen ? 'true' : undefined}
        className={`flex min-h-11 gap-x-3 border-l-3 py-2.5 pr-1 pl-2 -ml-2.5 hover:bg-raise ${mark}`}
        onMouseEnter={() => onPoint?.(key)}
        onMouseLeave={() => onPoint?.(null)}
        onFocus={() => onPoint?.(key)}
        onBlur={() => onPoint?.(null)}
        onClick={(event) => {
          if (!onChoose || event.metaKey || event.ctrlKey || event.shiftKey) return;
          event.preventDefault();
          onChoose(key);
        }}
      >
        <span className={`w-4 shrink-0 text-right ${isChosen ? 'font-bold text-pick' : 'text-soft'}`}>
          {numbers.get(key) ?? ''}
        </span>
        <span>
          <span className={`font-bold ${ink}`}>{head}</span>
          {text.slice(head.length)}
        </span>
      </a>
    </li>
  );
}
