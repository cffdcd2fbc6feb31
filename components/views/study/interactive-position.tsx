'use client';
/** A position of a study that one writes about: title and note are saved as one types, and said to be saved. */
import { useAutosave } from './use-autosave';

interface Props {
  readonly study: string;
  readonly position: { readonly id: string; readonly title: string; readonly note: string; readonly version: number };
}

const BOX =
  'w-full border border-transparent border-b-rule bg-transparent px-1 py-1 hover:border-b-hair focus:border-hair focus:bg-raise';

/** Two fields and a line that says how far saving is. */
export function InteractivePosition({ study, position }: Props) {
  const { values, change, says, isLost } = useAutosave(study, position);
  return (
    <div className="grid gap-y-2">
      <label className="grid">
        <span className="sr-only">Title</span>
        <input
          className={`${BOX} text-[18px] font-bold`}
          value={values.title}
          maxLength={200}
          placeholder="A title"
          onChange={(event) => change({ title: event.target.value })}
        />
      </label>
      <label className="grid">
        <span className="sr-only">Note</span>
        <textarea
          className={BOX}
          rows={Math.min(16, 3 + Math.ceil(values.note.length / 70))}
          value={values.note}
          maxLength={20_000}
          placeholder="What is to be seen here?"
          onChange={(event) => change({ note: event.target.value })}
        />
      </label>
      <p role="status" className={`text-[14px] ${isLost ? 'text-pick' : 'text-soft'}`}>
        {says}
      </p>
    </div>
  );
}
