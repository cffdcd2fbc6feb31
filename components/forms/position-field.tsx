/** The field for a position, its faults in place, and examples to start from. Works as a plain form without scripts. */
import type { ReactNode } from 'react';
import type { Fault } from '@/engine/board';

export interface PositionFieldProps {
  /** The page that the form leads to without scripts, and what else it carries there. */
  readonly action: string;
  readonly hidden: Readonly<Record<string, string>>;
  readonly text: string;
  readonly faults: readonly Fault[];
  /** The text could not be read at all. */
  readonly refused: boolean;
  /** Name of the button. */
  readonly verb: string;
  readonly onTyped: (text: string) => void;
  readonly onRead: (text: string) => void;
  /** Below the field: links to examples. */
  readonly children?: ReactNode;
}

/** One position as FEN, or a game whose last position is taken. What was typed stays whatever is wrong with it. */
export function PositionField(props: PositionFieldProps) {
  const { action, hidden, text, faults, refused, verb, onTyped, onRead, children } = props;
  return (
    <div>
      <form
        action={action}
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
            onChange={(event) => onTyped(event.target.value)}
            spellCheck={false}
            autoComplete="off"
            aria-invalid={refused || undefined}
            aria-describedby={faults.length > 0 ? 'fen-faults' : undefined}
            className={`h-11 min-w-0 grow rounded-sm border border-hair border-b-2 bg-raise px-3 text-[14px] ${refused ? 'border-b-pick' : 'border-b-ink'}`}
          />
          {Object.entries(hidden).map(([name, value]) => (
            <input key={name} type="hidden" name={name} value={value} />
          ))}
          <button
            type="submit"
            className="h-11 shrink-0 cursor-pointer rounded-sm bg-ink px-5 font-bold text-paper hover:underline print:hidden"
          >
            {verb}
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
      {children}
    </div>
  );
}
