/** A route of one's own: the field, how to draw it, and the verdict of each step with its reason. */
import type { RouteCheck } from '@/engine/reading/schema/routes';
import type { SquareName } from '@/engine/types';
import type { RoutesAct } from './state';

export interface OwnRouteProps {
  readonly typed: string;
  readonly man: SquareName | null;
  readonly check: RouteCheck | null;
  readonly fault: string | null;
  readonly hidden: Readonly<Record<string, string>>;
  readonly act: (act: RoutesAct) => void;
  readonly onBack: () => void;
}

const BUTTON = 'underlined min-h-11 cursor-pointer text-[14px]';

export function OwnRoute({ typed, man, check, fault, hidden, act, onBack }: OwnRouteProps) {
  return (
    <section aria-label="A route of your own" className={`mt-5 ${check === null ? 'print:hidden' : ''}`}>
      <h2 className="border-b border-rule pb-2">A route of your own</h2>
      <form
        action="/routes"
        className="pt-3 print:hidden"
        onSubmit={(event) => {
          event.preventDefault();
          act({ type: 'route-read' });
        }}
      >
        <label htmlFor="route" className="block text-[13px] leading-5 font-medium">
          {man === null ? 'Squares, the man’s first, or moves in SAN' : `Stops of the man on ${man}, or moves in SAN`}
        </label>
        <div className="mt-1 flex gap-x-2">
          <input
            id="route"
            name="route"
            value={typed}
            maxLength={200}
            onChange={(event) => act({ type: 'route-typed', text: event.target.value })}
            spellCheck={false}
            autoComplete="off"
            placeholder={man === null ? 'f3 d2 b3' : 'd2 b3'}
            aria-invalid={fault !== null || undefined}
            aria-describedby={fault === null ? 'route-how' : 'route-fault'}
            className={`h-11 min-w-0 grow rounded-sm border border-hair border-b-2 bg-raise px-3 text-[14px] placeholder:text-soft ${fault === null ? 'border-b-ink' : 'border-b-pick'}`}
          />
          {Object.entries(hidden).map(([name, value]) => (
            <input key={name} type="hidden" name={name} value={value} />
          ))}
          <button
            type="submit"
            className="h-11 shrink-0 cursor-pointer rounded-sm bg-ink px-5 font-bold text-paper hover:underline"
          >
            Check
          </button>
        </div>
      </form>
      {fault === null ? null : (
        <p id="route-fault" role="alert" className="mt-2 border-l-3 border-pick pl-3 text-[14px] leading-5">
          <span className="font-bold text-pick">This route cannot be read.</span> {fault}
        </p>
      )}
      {check === null ? (
        <p id="route-how" className="needs-scripts mt-2 text-[14px] leading-5 text-soft">
          {man === null
            ? 'Tap a man on the board, then the squares where it is to stop, in turn.'
            : 'Tap squares on the board in turn. The enemy stands still.'}{' '}
          By keys: arrows and Enter on the board, Delete takes a stop back, Escape clears.
        </p>
      ) : (
        <Verdicts check={check} />
      )}
      {typed === '' ? null : (
        <p className="needs-scripts flex gap-x-5 print:hidden">
          <button type="button" className={BUTTON} onClick={onBack}>
            Take the last stop back
          </button>
          <button type="button" className={BUTTON} onClick={() => act({ type: 'clear' })}>
            Clear
          </button>
        </p>
      )}
    </section>
  );
}

function Verdicts({ check }: { readonly check: RouteCheck }) {
  const { steps, holds, firstFault, kind, man } = check;
  const failed = firstFault === null ? undefined : steps[firstFault];
  return (
    <div className="mt-2" role="status">
      <p className="font-bold">
        {holds
          ? `The ${kind} gets from ${man} to ${steps[steps.length - 1]?.to ?? man}: every step is fine.`
          : `The step to ${failed?.to ?? ''} fails.`}
      </p>
      <ol>
        {steps.map(({ to, code, reason, guard }, index) => (
          <li key={index} className={`mt-1 border-l-3 py-1 pl-3 ${code === 'fine' ? 'border-rule' : 'border-pick'}`}>
            <span className="font-bold">{`${index + 1} ${to} `}</span>
            <span className={`font-medium ${code === 'fine' ? '' : 'text-pick'}`}>
              {code === 'fine' ? 'fine. ' : 'fails. '}
            </span>
            {reason}
            {guard?.verdict === 'unknown' ? ' The tactical check gave up before its end.' : ''}
          </li>
        ))}
      </ol>
    </div>
  );
}
