/** The choice of layer: words on a rule, the chosen one under our small pennant. */
import { LAYERS } from '@/components/plate/types';
import { LAYER_NAMES } from '@/components/plate/words';
import { type Address, addressHref } from './address';
import type { Act } from './state';

export function LayerBar({
  layer,
  address,
  act,
}: {
  readonly layer: string;
  readonly address: Address;
  readonly act: (act: Act) => void;
}) {
  return (
    <nav aria-label="Layer" className="-mx-3 max-w-full overflow-x-auto px-3">
      <ul className="flex border-b border-ink">
        {LAYERS.map((each, index) => (
          <li key={each} className={index > 0 ? 'border-l border-rule' : ''}>
            <a
              href={addressHref(address, { layer: each })}
              aria-current={each === layer ? 'page' : undefined}
              className={`relative flex min-h-11 items-end px-3 pb-1.5 whitespace-nowrap ${each === layer ? 'border-b-3 border-ink pb-[3px] font-bold' : 'text-soft hover:text-ink'}`}
              onClick={(event) => {
                if (event.metaKey || event.ctrlKey || event.shiftKey) return;
                event.preventDefault();
                act({ type: 'layer', layer: each });
              }}
            >
              {each === layer ? (
                <svg viewBox="0 0 12 14" width={12} height={14} aria-hidden="true" className="absolute top-0.5 left-3">
                  <path d="M1 0v14" stroke="var(--ink)" strokeWidth={1.5} />
                  <path d="M2 1l9 3.5L2 8z" fill="var(--ochre)" />
                </svg>
              ) : null}
              {LAYER_NAMES[each]}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}
