/** Words saved as they are typed, by the version they start from: nobody overwrites what they have not seen. */
import { useEffect, useRef, useState } from 'react';
import { apiClient } from '@/openapi/client';

interface Words {
  readonly title: string;
  readonly note: string;
}

interface Saved extends Words {
  readonly id: string;
  readonly version: number;
}

/** Milliseconds of silence after which what was typed is saved. */
const PAUSE_MS = 700;
const AGAIN_MS = 4000;

type Saving = 'saved' | 'typing' | 'saving' | 'offline' | 'lost';

const SAYS: Readonly<Record<Saving, string>> = {
  saved: 'Saved',
  typing: 'Not saved yet …',
  saving: 'Saving …',
  offline: 'Could not be saved; it is tried again. What you typed is still here.',
  lost: 'Somebody else has changed this meanwhile. What you typed is still here: copy it, then reload the page.',
};

/** The words, a way to change them, and how far saving is. */
export function useAutosave(study: string, position: Saved) {
  const [values, setValues] = useState<Words>({ title: position.title, note: position.note });
  const [saving, setSaving] = useState<Saving>('saved');
  const version = useRef(position.version);
  const wanted = useRef<Words>(values);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const busy = useRef(false);

  async function save(): Promise<void> {
    if (busy.current) return;
    busy.current = true;
    setSaving('saving');
    // What is typed while this is on its way is sent next.
    for (let sent: Words | undefined; sent !== wanted.current; ) {
      sent = wanted.current;
      const outcome = await sendWords(study, position.id, version.current, sent);
      if (outcome === 'lost' || outcome === 'offline') {
        busy.current = false;
        setSaving(outcome);
        if (outcome === 'offline') timer.current = setTimeout(() => void save(), AGAIN_MS);
        return;
      }
      version.current = outcome;
    }
    busy.current = false;
    setSaving('saved');
  }

  const change = (part: Partial<Words>): void => {
    const next = { ...wanted.current, ...part };
    wanted.current = next;
    setValues(next);
    if (saving === 'lost') return;
    setSaving('typing');
    clearTimeout(timer.current);
    timer.current = setTimeout(() => void save(), PAUSE_MS);
  };

  useEffect(() => {
    const hold = (event: BeforeUnloadEvent): void => {
      if (saving !== 'saved') event.preventDefault();
    };
    window.addEventListener('beforeunload', hold);
    return () => window.removeEventListener('beforeunload', hold);
  }, [saving]);

  return { values, change, says: SAYS[saving], isLost: saving === 'lost' || saving === 'offline' };
}

/** Sends the words; gives the new version, or why there is none. */
async function sendWords(
  study: string,
  id: string,
  version: number,
  words: Words,
): Promise<number | 'lost' | 'offline'> {
  const outcome = await apiClient()
    .PATCH('/api/v1/studies/{id}/positions/{positionId}', {
      params: { path: { id: study, positionId: id }, header: { 'If-Match': `"v${version}"` } },
      body: { title: words.title, note: words.note },
    })
    .catch(() => undefined);
  if (outcome?.data) return outcome.data.version;
  return outcome?.response.status === 412 ? 'lost' : 'offline';
}
