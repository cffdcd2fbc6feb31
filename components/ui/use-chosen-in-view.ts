/** Keeps the chosen item of a list that scrolls sideways in sight, without moving the page. */
import { useEffect, useRef } from 'react';

/** The ref for the list; whenever `chosen` changes, its item with `aria-current` comes into view. */
export function useChosenInView(chosen: unknown) {
  const frame = useRef<HTMLElement>(null);
  useEffect(() => {
    const list = frame.current;
    const item = list?.querySelector('[aria-current]');
    if (!list || !item || list.scrollWidth <= list.clientWidth) return;
    const place = item.getBoundingClientRect();
    const room = list.getBoundingClientRect();
    if (place.left < room.left || place.right > room.right)
      list.scrollLeft += place.left - room.left - (room.width - place.width) / 2;
  }, [chosen]);
  return frame;
}
