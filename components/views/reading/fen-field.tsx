/** The field for a position, its faults in place, and examples to start from. Works as a plain form without scripts. */
import type { Fault } from '@/engine/board';
import { EXAMPLES } from './examples';
import type { Act } from './state';

export interface FenFieldProps {
  readonly text: string;
  readonly faults: readonly Fault[];
  readonly refused: boolean;
  readonly layer: string;
  readonly act: (act: Act) => void;
  /** Reads what was typed: a FEN, or a game whose last position is taken. */
  readonly onRead: (text: string) => void;
}

export function FenField({ text, faults, refused, layer, act, onRead }: FenFieldProps) {
  return (
    <div className="lg:-mt-[86px] lg:ml-auto lg:w-[50%]">
      <form
        action="/"
        onSubmit={(event) => {
          event.preventDefault();
          onRead(text);
        }}
      >
        <label htmlFor="fen" className="block text-[13px] leading-5 font-medium">
          Position, as FEN or as the moves of a game (PGN)
        </label>
        <div className="mt-1 flex gap-x-2">
          <input
            id="fen"
            name="fen"
            value={text}
            onChange={(event) => act({ type: 'typed', text: event.target.value })}
            spellCheck={false}
            autoComplete="off"
            aria-invalid={refused || undefined}
            aria-describedby={faults.length > 0 ? 'fen-faults' : undefined}
            className={`h-11 min-w-0 grow rounded-sm border border-hair border-b-2 bg-raise px-3 text-[14px] ${refused ? 'border-b-pick' : 'border-b-ink'}`}
          />
          <input type="hidden" name="layer" value={layer} />
          <button
            type="submit"
            className="h-11 shrink-0 cursor-pointer rounded-sm bg-ink px-5 font-bold text-paper hover:underline"
          >
            Read
          </button>
        </div>
      </form>
      {faults.length > 0 ? (
        <div
          id="fen-faults"
          role={refused ? 'alert' : 'status'}
          className="mt-2 border-l-3 border-pick pl-3 text-[14px] leading-5"
        >
          <p className="font-bold text-pick">
            {refused
              ? 'This cannot be read. The plate shows the position before.'
              : 'Read as a diagram: no game can have this position.'}
          </p>
          <ul>
            {faults.map(({ code, message, square }) => (
              <li key={`${code}${square ?? ''}${message}`}>{message}</li>
            ))}
          </ul>
        </div>
      ) : null}
      <p className="mt-1 flex flex-wrap items-center gap-x-4 text-[14px] text-soft">
        <span>Examples:</span>
        {EXAMPLES.map(({ name, fen }) => (
          <a
            key={name}
            href={`/?${new URLSearchParams({ fen, layer }).toString()}`}
            className="underlined flex min-h-9 items-center text-ink"
            onClick={(event) => {
              if (event.metaKey || event.ctrlKey || event.shiftKey) return;
              event.preventDefault();
              act({ type: 'read', text: fen });
            }}
          >
            {name}
          </a>
        ))}
      </p>
    </div>
  );
}
