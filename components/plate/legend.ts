/** The legend: only the marks that occur on the plate, each as a small figure with its words. */
import type { Reading } from '@/engine/reading/schema';
import { entryMarks, fileMarks } from './layers/files';
import { pennant, shownPosts } from './layers/outposts';
import { ring } from './layers/weak';
import { box } from './place';
import type { BoardPlace, Layer, LegendItem, Mark } from './types';

/** Width and height of a legend figure, px. */
export const LEGEND_FIGURE = { width: 24, height: 16 };

/** The legend of a layer. `id` is the prefix of the plate's patterns. */
export function legendOf(reading: Reading, layer: Layer, board: BoardPlace, id: string, print: boolean): LegendItem[] {
  const items: LegendItem[] = [];
  if (layer === 'command') {
    const states = new Set(reading.squares.map(({ command }) => command));
    if (states.has('white')) items.push({ label: 'White commands', marks: swatch('white', id, print) });
    if (states.has('black')) items.push({ label: 'Black commands', marks: swatch('black', id, print) });
    if (states.has('disputed')) items.push({ label: 'disputed', marks: hatched(id) });
    if (states.has('open'))
      items.push({
        label: 'open',
        marks: [{ type: 'path', d: box(0.5, 0.5, 23, 15), stroke: 'hair', width: 1, fill: 'paper' }],
      });
  }
  if (layer === 'command' || layer === 'control') items.push({ label: 'attackers, one behind', marks: pips() });
  if (layer === 'command' || layer === 'weak') items.push(...ringItems(reading, layer, print));
  if (layer === 'command' || layer === 'outposts') items.push(...pennantItems(reading, print));
  if (layer === 'command' || layer === 'files') items.push(...fileItems(reading, board, layer));
  if (layer === 'mobility') items.push({ label: 'safe moves', marks: heatScale() });
  return items;
}

function swatch(side: 'white' | 'black', id: string, print: boolean): Mark[] {
  const [wash, weak, strong, pattern] =
    side === 'white'
      ? (['ochre-wash', 'wash-a', 'band-a', `${id}dots`] as const)
      : (['indigo-wash', 'iwash-a', 'iband-a', `${id}lines`] as const);
  const band = 'M0 0h24v16h-24zM5 5v6h14v-6z';
  return [
    { type: 'path', d: box(0, 0, 24, 16), fill: wash, strength: weak },
    { type: 'path', d: band, fill: wash, strength: strong },
    { type: 'path', d: band, fill: { pattern } },
    ...(print ? [{ type: 'path', d: box(0.5, 0.5, 23, 15), stroke: 'ink', width: 0.9, fill: 'none' } as const] : []),
  ];
}

function hatched(id: string): Mark[] {
  return [
    { type: 'path', d: box(0, 0, 24, 16), fill: { pattern: `${id}cross` } },
    { type: 'path', d: box(0.5, 0.5, 23, 15), stroke: 'hair', width: 1, fill: 'none' },
  ];
}

function pips(): Mark[] {
  return [
    { type: 'circle', x: 6, y: 4.5, r: 2.8, fill: 'indigo' },
    { type: 'circle', x: 13.5, y: 4.5, r: 1.6, fill: 'indigo' },
    { type: 'circle', x: 6, y: 11.5, r: 2.6, fill: 'paper', stroke: 'ochre', width: 1.3 },
    { type: 'circle', x: 13.5, y: 11.5, r: 1.4, fill: 'paper', stroke: 'ochre', width: 1 },
  ];
}

function ringItems({ weakSquares }: Reading, layer: Layer, print: boolean): LegendItem[] {
  const shown = weakSquares.filter(({ matters }) => matters);
  const items: LegendItem[] = [];
  const good = shown.find(({ hold }) => hold === 'permanent');
  const fixed = shown.find(({ hold }) => hold === 'fixed');
  if (good) items.push({ label: 'weak for good', marks: ring(good.side, false, 12, 8, 7.2, true, print) });
  if (fixed) items.push({ label: 'weak while fixed', marks: ring(fixed.side, true, 12, 8, 7.2, true, print) });
  if (layer === 'weak' && weakSquares.some(({ matters }) => !matters)) {
    items.push({ label: 'weak, of little weight', marks: ring('white', false, 12, 8, 7.2, false, print) });
  }
  return items;
}

function pennantItems({ outposts }: Reading, print: boolean): LegendItem[] {
  const shown = shownPosts(outposts);
  const kinds = [
    ['outpost for good', shown.find((post) => post.rank === 'outpost' && post.hold === 'permanent')],
    ['outpost while fixed', shown.find((post) => post.rank === 'outpost' && post.hold === 'fixed')],
    ['advanced post', shown.find((post) => post.rank === 'advanced')],
  ] as const;
  return kinds.flatMap(([label, post]) => (post ? [{ label, marks: pennant(post, 20, 2, 62, print) }] : []));
}

function fileItems(reading: Reading, board: BoardPlace, layer: Layer): LegendItem[] {
  const items: LegendItem[] = [];
  const half = reading.files.find(({ halfOpenFor }) => halfOpenFor !== null);
  if (half && fileMarks(reading, board).length > 0) {
    const stroke = half.halfOpenFor === 'white' ? 'ochre' : 'indigo';
    items.push({ label: 'half-open file', marks: [{ type: 'path', d: 'M0 8h24', stroke, width: 2.6, fill: 'none' }] });
  }
  if (reading.files.some(({ status }) => status === 'open')) {
    items.push({
      label: 'open file',
      marks: [{ type: 'path', d: 'M0 6.5h24M0 9.5h24', stroke: 'ink', width: 1.2, fill: 'none' }],
    });
  }
  if (layer === 'files' && entryMarks(reading, board).length > 0) {
    const entries = reading.files.find(({ entries: squares }) => squares.white.length + squares.black.length > 0);
    const stroke = entries && entries.entries.white.length > 0 ? 'ochre' : 'indigo';
    if (entries)
      items.push({
        label: 'entry square',
        marks: [{ type: 'path', d: 'M7 15v-7M12 15v-11M17 15v-7', stroke, width: 1.6, fill: 'none' }],
      });
    if (reading.files.some(({ targets }) => targets.length > 0)) {
      items.push({
        label: 'target',
        marks: [
          {
            type: 'path',
            d: 'M5 5V1.5H9M15 1.5H19V5M19 11V14.5H15M9 14.5H5V11',
            stroke: 'ink',
            width: 1.4,
            fill: 'none',
          },
        ],
      });
    }
  }
  return items;
}

function heatScale(): Mark[] {
  return [0, 4, 8].flatMap((moves, index): Mark[] => [
    { type: 'path', d: box(index * 8, 1, 8, 14), fill: 'heat', strength: { heat: moves } },
  ]);
}
