/** The chosen way in words and figures: what it gives, its stops, who disputes the post, what comes first, the safeguard. */
import type { ReactNode } from 'react';
import type { RouteChoice, RouteStep } from '@/engine/reading/schema/routes';
import type { Side } from '@/engine/types';
import type { RankedChoice } from './ask';
import { PartsList } from './parts-list';
import { Race } from './race';
import { movesText, SIDE_NAMES } from './words';

export function Way({ choice, side }: { readonly choice: RankedChoice; readonly side: Side }) {
  const { man, kind, post, text, steps, shortest } = choice;
  return (
    <section aria-label="The way" className="double-rule-top mt-8 pt-6">
      <h2 className="border-b border-rule pb-2">{`The way: ${kind} ${man} to ${post}`}</h2>
      <div className="grid grid-cols-[minmax(0,1fr)] gap-x-12 lg:grid-cols-[minmax(0,11fr)_minmax(0,10fr)]">
        <div>
          <p className="max-w-170 py-3">{text}</p>
          <Stops steps={steps} />
          <PartsList choice={choice} side={side} />
        </div>
        <dl className="mt-3 lg:mt-0">
          <Fact term="Ways of this length">{waysText(shortest)}</Fact>
          <Fact term="The enemy’s soonest challenge">
            {challengeText(choice, side)}
            <Race side={side} moves={choice.moves} challenge={choice.challenge?.moves ?? null} />
          </Fact>
          <Fact term="Must come first, or shortens it">{preparationText(choice)}</Fact>
          <Fact term="Left behind">
            {choice.drops.length === 0
              ? 'No duty is dropped.'
              : `It no longer guards ${choice.drops.map(({ square }) => square).join(', ')}.`}
          </Fact>
          <Fact term="Safeguard, not an opinion: the tactical check">{guardText(choice)}</Fact>
        </dl>
      </div>
    </section>
  );
}

function Fact({ term, children }: { readonly term: string; readonly children: ReactNode }) {
  return (
    <div className="border-b border-rule py-2.5">
      <dt className="text-[13px] leading-5 font-medium text-soft">{term}</dt>
      <dd>{children}</dd>
    </div>
  );
}

function waysText(shortest: number): string {
  if (shortest === 1) return 'This one alone is safe.';
  if (shortest === 2) return 'Two safe ones; the other is in lighter ink on the plate.';
  return `${shortest} safe ones; others are in lighter ink on the plate.`;
}

/** The stops as a table: who attacks, who guards, which pawn can hit. */
function Stops({ steps }: { readonly steps: readonly RouteStep[] }) {
  return (
    <div className="mt-3 overflow-x-auto" role="region" aria-label="Stops" tabIndex={0}>
      <table className="w-full border-collapse text-[14px] leading-5">
        <caption className="sr-only">Stops of the way, the enemy standing still</caption>
        <thead>
          <tr className="border-y border-ink text-left">
            {['Stop', 'Attacked by', 'Guarded by', 'A pawn can hit it'].map((head) => (
              <th key={head} scope="col" className="px-2 py-1 font-medium first:pl-0">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {steps.map(({ to, attackedBy, guardedBy, pawnHit }, index) => (
            <tr key={to} className="border-b border-rule align-top">
              <th scope="row" className="px-2 py-1.5 pl-0 text-left font-bold whitespace-nowrap">
                {`${index + 1} ${to}`}
              </th>
              <td className="px-2 py-1.5">{menText(attackedBy)}</td>
              <td className="px-2 py-1.5">{menText(guardedBy)}</td>
              <td className="px-2 py-1.5">
                {pawnHit === null
                  ? 'never'
                  : `${pawnHit.from}, ${pawnHit.moves === 0 ? 'now' : `in ${movesText(pawnHit.moves)}`}`}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function menText(squares: readonly string[]): string {
  return squares.length === 0 ? 'none' : `${squares.length}: ${squares.join(', ')}`;
}

function challengeText({ challenge, moves, post }: RouteChoice, side: Side): string {
  const enemy = SIDE_NAMES[side === 'white' ? 'black' : 'white'];
  if (challenge === null) return `None within three moves. The way takes ${movesText(moves)}.`;
  const who = `${enemy}’s ${challenge.kind} on ${challenge.by}`;
  if (challenge.moves === 0) return `${who} bears on ${post} already. The way takes ${movesText(moves)}.`;
  return `${who}, in ${movesText(challenge.moves)}. The way takes ${movesText(moves)}.`;
}

function preparationText({ preparations, needs, moves }: RouteChoice): string {
  const [first] = preparations;
  if (!first) return 'Nothing.';
  if (needs !== null) return `${needs} must come first: ${movesText(first.moves)} in all.`;
  return preparations
    .map(({ move, moves: all }) => `${move} first makes it ${movesText(all)} in all instead of ${moves}.`)
    .join(' ');
}

function guardText({ guard }: RouteChoice): string {
  const line = guard.line.length > 0 ? ` ${guard.line.join(' ')}` : '';
  switch (guard.verdict) {
    case 'holds':
      return 'Nothing is lost by force after any step.';
    case 'unknown':
      return `It gave up before its end: no verdict.${line}`;
    case 'loses':
      return `${lossText(guard)}:${line}.`;
  }
}

function lossText({ loses, line }: RouteChoice['guard']): string {
  if (line[line.length - 1]?.endsWith('#')) return 'Mate follows';
  return `${loses === 1 ? 'One pawn’s worth' : `${loses} pawns’ worth`} is lost by force`;
}
