/** The ranking of posts on the page: the chart, a link over each row, legend, table and files. */
import { LegendFigure, PlateMarks } from '@/components/plate/draw-jsx';
import { captioned } from '@/components/plate/captioned';
import type { Drawing } from '@/components/plate/types';
import { csvOf } from '@/components/ui/csv';
import { FigureLine } from '@/components/ui/figure-line';
import { saveFile } from '@/components/ui/save-file';
import { SaveLinks } from '@/components/ui/save-links';
import { TableSwitch } from '@/components/ui/table-switch';
import type { SquareName } from '@/engine/types';
import type { Answer, RankedChoice } from './ask';
import { rankingOf, ROW_HEIGHT } from './layout';
import { rankingDrawing, rankingLegend } from './ranking-marks';
import { RANKING_HEADS, rankingRows } from './table';
import { choiceName, SIDE_NAMES, signed, wayText } from './words';

export interface RankingFigureProps {
  readonly answer: Answer;
  readonly man: SquareName | null;
  /** Place of the chosen row. */
  readonly chosen: number;
  /** Width of the place, px; null while the page does not know it. */
  readonly width: number | null;
  readonly hrefOf: (choice: RankedChoice) => string;
  readonly onChoose: (choice: RankedChoice) => void;
}

/** Widths that stand in until the page knows its own: of a desk and of a phone. */
const UNKNOWN = [
  { width: 620, shown: 'hidden md:block' },
  { width: 366, shown: 'md:hidden' },
] as const;

export function RankingFigure(props: RankingFigureProps) {
  const { answer, man, chosen, width } = props;
  const { choices, side, engine, reading } = answer;
  const kind = answer.men.find(({ square }) => square === man)?.kind;
  const title = kind ? `Posts of the ${kind} on ${man}` : `${SIDE_NAMES[side]}’s posts, all men`;
  if (choices.length === 0)
    return (
      <section aria-label={title}>
        <h2>{title}</h2>
        <p className="mt-1 text-soft">
          {answer.men.length === 0
            ? `${SIDE_NAMES[side]} has no knight, bishop, rook or queen here. Ask the other side, or read another position.`
            : 'It has no safe way to any square within four moves. Choose another man.'}
        </p>
      </section>
    );
  const drawn = (wide: number, id: string) => {
    const ranking = rankingOf(choices, wide);
    return { ranking, drawing: rankingDrawing({ ranking, width: wide, side, named: man === null, chosen, id, title }) };
  };
  const source = [`Waypost engine ${engine}`, SIDE_NAMES[side], reading.fen];
  const saveSvg = async () => {
    const { drawSvg } = await import('@/components/plate/draw-svg');
    const { ranking, drawing } = drawn(720, 'f');
    const text = `Gain by the documented weights, less two for each further move. ${source.join(' · ')}`;
    saveFile(
      'waypost-posts.svg',
      'image/svg+xml',
      drawSvg(captioned(drawing, text, rankingLegend(ranking, side, 'f')), 'light'),
    );
  };
  const rows = rankingRows(choices);
  const figures = width === null ? UNKNOWN : [{ width, shown: '' }];
  return (
    <section aria-label={title}>
      <h2>{title}</h2>
      <p className="mt-0.5 text-[13px] leading-5 text-soft">
        Each box is one count that changes, as wide as its weight; what helps stands right of the line. Unit: the table
        of weights, less two for each further move.
      </p>
      {figures.map((each, index) => (
        <Figure key={index} {...props} {...drawn(each.width, `r${index}`)} shown={each.shown} />
      ))}
      <ul className="mt-3 flex flex-wrap gap-x-5 gap-y-1.5 text-[12px] leading-[18px] text-soft">
        {rankingLegend(rankingOf(choices, 620), side, 'r0').map((item) => (
          <li key={item.label} className="flex items-center gap-x-2">
            <LegendFigure item={item} />
            {item.label}
          </li>
        ))}
      </ul>
      <FigureLine parts={source} />
      <TableSwitch caption={`${title}: counts now and there`} heads={RANKING_HEADS} rows={rows}>
        <SaveLinks
          of="Chart"
          saves={[
            { kind: 'SVG', save: () => void saveSvg() },
            { kind: 'CSV', save: () => saveFile('waypost-posts.csv', 'text/csv', csvOf(RANKING_HEADS, rows)) },
          ]}
        />
      </TableSwitch>
    </section>
  );
}

function Figure({
  drawing,
  shown,
  answer,
  man,
  chosen,
  hrefOf,
  onChoose,
}: RankingFigureProps & { readonly drawing: Drawing; readonly shown: string }) {
  const { width, height } = drawing;
  return (
    <div className={`relative mt-2 ${shown}`}>
      <svg viewBox={`0 0 ${width} ${height}`} width="100%" className="block" role="img" aria-label={drawing.alt}>
        <PlateMarks plate={drawing} />
      </svg>
      <ol>
        {answer.choices.map((choice, index) => (
          <li key={`${choice.man}-${choice.post}-${choice.needs ?? ''}`}>
            <a
              href={hrefOf(choice)}
              aria-current={index === chosen ? 'true' : undefined}
              className="absolute inset-x-0 hover:outline-1 hover:outline-hair"
              style={{
                top: `${(100 * (height - 4 - (answer.choices.length - index) * ROW_HEIGHT)) / height}%`,
                height: `${(100 * (ROW_HEIGHT - 3)) / height}%`,
              }}
              onClick={(event) => {
                if (event.metaKey || event.ctrlKey || event.shiftKey) return;
                event.preventDefault();
                onChoose(choice);
              }}
            >
              <span className="sr-only">
                {`${index + 1}. ${choiceName(choice, man === null)}, ${wayText(choice)}, ${signed(choice.merit, 2)}`}
              </span>
            </a>
          </li>
        ))}
      </ol>
    </div>
  );
}
