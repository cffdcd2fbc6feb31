/** The way's length beside the enemy's soonest challenge: two dotted lines on one scale of moves. */
import type { Side } from '@/engine/types';
import { opponent } from '@/engine/types';
import { SIDE_NAMES } from './words';

const STEP = 34;
const LEFT = 62;
const INK: Readonly<Record<Side, string>> = { white: 'var(--ochre)', black: 'var(--indigo)' };

export interface RaceProps {
  readonly side: Side;
  readonly moves: number;
  /** Enemy moves until he attacks the post; null where he does not come. */
  readonly challenge: number | null;
}

/** Decorative beside the sentence that says the same; hidden from readers. */
export function Race({ side, moves, challenge }: RaceProps) {
  const longest = Math.max(moves, challenge ?? 0, 1);
  return (
    <svg
      width={LEFT + longest * STEP + 14}
      height={52}
      viewBox={`0 0 ${LEFT + longest * STEP + 14} 52`}
      aria-hidden="true"
      className="mt-1 max-w-full"
    >
      <Line side={side} y={13} moves={moves} />
      {challenge === null ? null : <Line side={opponent(side)} y={39} moves={challenge} />}
    </svg>
  );
}

function Line({ side, y, moves }: { readonly side: Side; readonly y: number; readonly moves: number }) {
  const stops = Array.from({ length: moves }, (_, index) => index + 1);
  return (
    <g stroke={INK[side]} fill={INK[side]}>
      <text x={0} y={y + 4.5} fontSize={13} stroke="none">
        {SIDE_NAMES[side]}
      </text>
      <path d={`M${LEFT - 8} ${y - 6}v12`} strokeWidth={2} />
      {moves === 0 ? null : (
        <path
          d={`M${LEFT - 2} ${y}H${LEFT + moves * STEP}`}
          strokeWidth={2.6}
          strokeLinecap="round"
          strokeDasharray="0.01 5.5"
        />
      )}
      {stops.map((stop) => (
        <g key={stop}>
          <circle
            cx={LEFT + stop * STEP}
            cy={y}
            r={10}
            fill={stop === moves ? INK[side] : 'var(--paper)'}
            strokeWidth={1.5}
          />
          <text
            x={LEFT + stop * STEP}
            y={y + 4.2}
            fontSize={12}
            fontWeight={700}
            textAnchor="middle"
            stroke="none"
            fill={stop === moves ? 'var(--paper)' : INK[side]}
          >
            {stop}
          </text>
        </g>
      ))}
    </g>
  );
}
