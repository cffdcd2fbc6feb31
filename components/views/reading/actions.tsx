/** What can be done with the whole plate: turn it, change the side to move, go back, take it along. */
import { squareName } from '@/engine/board';
import { addressHref } from './address';
import { type Act, addressOf, type PageState } from './state';

const LINK =
  'underlined flex min-h-11 cursor-pointer items-center text-[14px] disabled:cursor-default disabled:text-hair disabled:no-underline';

export function Actions({ state, act }: { readonly state: PageState; readonly act: (act: Act) => void }) {
  const address = addressOf(state);
  const figure = (kind: 'svg' | 'png') => {
    const query = new URLSearchParams({ fen: address.fen, layer: address.layer, width: '1312', notes: 'margin' });
    if (address.flipped) query.set('side', 'black');
    if (address.layer === 'mobility' && address.man !== null) query.set('man', squareName(address.man));
    return `/api/v1/plates.${kind}?${query.toString()}`;
  };
  return (
    <div className="flex flex-wrap gap-x-5">
      <button type="button" className={`needs-scripts ${LINK}`} onClick={() => act({ type: 'side' })}>
        {state.position.sideToMove === 'white' ? 'White to move' : 'Black to move'}
      </button>
      <a
        href={addressHref(address, { flipped: !address.flipped })}
        className={LINK}
        onClick={(event) => {
          event.preventDefault();
          act({ type: 'turn' });
        }}
      >
        Turn board
      </a>
      <button
        type="button"
        className={`needs-scripts ${LINK}`}
        disabled={state.undo.length === 0}
        onClick={() => act({ type: 'undo' })}
      >
        Undo
      </button>
      <a href={`/routes?${new URLSearchParams({ fen: address.fen }).toString()}`} className={LINK}>
        Routes
      </a>
      <a href={`/keep?${new URLSearchParams({ fen: address.fen }).toString()}`} className={LINK}>
        Keep in a study
      </a>
      <span className="flex items-center gap-x-2 text-[14px]">
        Figure:
        <a href={figure('svg')} download="waypost-plate.svg" className={LINK}>
          SVG
        </a>
        <a href={figure('png')} download="waypost-plate.png" className={LINK}>
          PNG
        </a>
      </span>
    </div>
  );
}
