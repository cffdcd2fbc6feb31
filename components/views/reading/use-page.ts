/** What the live reading asks of the page around it: how wide it is, and that the address follows. */
import { useEffect, useRef, useState } from 'react';

/** Rest after which the address is written, ms: a drag passes many positions. */
const REST_MS = 250;

/** The width of the element that takes `frame`, px; null before the page is alive. */
export function useWidth() {
  const frame = useRef<HTMLDivElement>(null);
  const [width, setWidth] = useState<number | null>(null);
  useEffect(() => {
    const element = frame.current;
    if (!element) return;
    const measure = () => setWidth(Math.round(element.clientWidth));
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return { frame, width };
}

/** Writes the address into the browser's bar, without a new entry in its history. */
export function useAddress(href: string): void {
  useEffect(() => {
    const timer = setTimeout(() => window.history.replaceState(window.history.state, '', href), REST_MS);
    return () => clearTimeout(timer);
  }, [href]);
}
