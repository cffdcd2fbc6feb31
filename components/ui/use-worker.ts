/** The page's end of a worker: asks are numbered, and only the answer to the latest counts. */
import { useEffect, useRef, useState } from 'react';
import type { Numbered } from './worker-door';

export interface WorkerDoor<A, B> {
  /** `() => new Worker(new URL('./x.worker.ts', import.meta.url))`: in these words, so that the bundler sees it. */
  readonly open: () => Worker;
  /** The same sum on the page itself, for browsers that refuse the worker; fetched only then. */
  readonly here: () => Promise<(ask: A) => B>;
}

/**
 * The answer to the latest ask, with the ask that it belongs to. `first` is what the server sent: it is not asked
 * again. `isLate` while a newer ask is under way, so that the page can say so. `door` must stand outside the component.
 */
export function useWorker<A, B>(
  door: WorkerDoor<A, B>,
  ask: A,
  first: B,
): { readonly answer: B; readonly isLate: boolean } {
  const text = JSON.stringify(ask);
  const [got, setGot] = useState({ text, answer: first });
  const worker = useRef<Worker | 'refused' | null>(null);
  const shown = got.text;

  useEffect(() => {
    if (text === shown) return;
    let isWanted = true;
    const take = (answer: B) => {
      if (isWanted) setGot({ text, answer });
    };
    const sumHere = () => void door.here().then((sum) => take(sum(JSON.parse(text) as A)));
    if (worker.current === null) {
      try {
        worker.current = door.open();
      } catch {
        worker.current = 'refused';
      }
    }
    const thread = worker.current;
    if (thread === 'refused') {
      sumHere();
      return () => {
        isWanted = false;
      };
    }
    const id = nextId++;
    const hear = ({ data }: MessageEvent<Numbered<B>>) => {
      if (data.id === id) take(data.value);
    };
    const fail = () => {
      worker.current = 'refused';
      sumHere();
    };
    thread.addEventListener('message', hear);
    thread.addEventListener('error', fail);
    thread.postMessage({ id, value: JSON.parse(text) as A } satisfies Numbered<A>);
    return () => {
      isWanted = false;
      thread.removeEventListener('message', hear);
      thread.removeEventListener('error', fail);
    };
  }, [door, text, shown]);

  useEffect(
    () => () => {
      if (worker.current instanceof Worker) worker.current.terminate();
      worker.current = null;
    },
    [],
  );
  return { answer: got.answer, isLate: got.text !== text };
}

let nextId = 1;
