/** What can be done with the whole plate: ask the other side, turn it, read it, take it along. */
import type { Plate } from '@/components/plate/types';
import { saveFile } from '@/components/ui/save-file';
import { SaveLinks } from '@/components/ui/save-links';
import { opponent, type Side, type SquareName } from '@/engine/types';
import { type RoutesAddress, routesHref } from './address';
import type { RoutesAct } from './state';
import { SIDE_NAMES } from './words';

export interface RoutesActionsProps {
  readonly address: RoutesAddress;
  readonly side: Side;
  readonly act: (act: RoutesAct) => void;
  /** The way that the plate shows; null where it shows a route of one's own, which only the page can draw. */
  readonly way: { readonly man: SquareName; readonly post: SquareName } | null;
  /** The plate as it goes into a file. */
  readonly drawing: () => Plate;
}

const LINK = 'underlined flex min-h-11 items-center text-[14px]';

export function RoutesActions({ address, side, act, way, drawing }: RoutesActionsProps) {
  const other = opponent(side);
  const save = async () => {
    const { drawSvg } = await import('@/components/plate/draw-svg');
    saveFile('waypost-routes.svg', 'image/svg+xml', drawSvg(drawing(), 'light'));
  };
  return (
    <div className="mt-2 flex flex-wrap gap-x-5 lg:justify-center print:hidden">
      <a
        href={routesHref(address, { of: other, man: null, post: null, route: '' })}
        className={LINK}
        onClick={(event) => {
          event.preventDefault();
          act({ type: 'of', side: other });
        }}
      >
        {`${SIDE_NAMES[other]}’s men`}
      </a>
      <a
        href={routesHref(address, { flipped: !address.flipped })}
        className={LINK}
        onClick={(event) => {
          event.preventDefault();
          act({ type: 'turn' });
        }}
      >
        Turn board
      </a>
      <a href={`/?${new URLSearchParams({ fen: address.fen }).toString()}`} className={LINK}>
        Read this position
      </a>
      {way === null ? (
        <SaveLinks of="Plate" saves={[{ kind: 'SVG', save: () => void save() }]} />
      ) : (
        <p className="flex items-center gap-x-3 text-[14px]">
          <span className="text-soft">Plate:</span>
          {(['svg', 'png'] as const).map((kind) => (
            <a
              key={kind}
              href={figureHref(kind, address, way)}
              download={`waypost-routes.${kind}`}
              aria-label={`Save the plate as ${kind.toUpperCase()}`}
              className="underlined flex min-h-11 min-w-6 items-center"
            >
              {kind.toUpperCase()}
            </a>
          ))}
        </p>
      )}
    </div>
  );
}

/** The same plate from the API, at an address that an article can hold. */
function figureHref(kind: 'svg' | 'png', { fen, flipped }: RoutesAddress, way: { man: string; post: string }): string {
  const query = new URLSearchParams({ fen, layer: 'routes', man: way.man, post: way.post, width: '720' });
  if (flipped) query.set('side', 'black');
  return `/api/v1/plates.${kind}?${query.toString()}`;
}
