'use client';
/** A form that an action of the server answers: it works without scripts, keeps what was typed, and says faults in place. */
import { useActionState, useId } from 'react';
import { FieldRow } from './field-row';
import type { FormField, FormState } from '@/openapi/schemas/form-state';

interface Props {
  readonly action: (state: FormState, form: FormData) => Promise<FormState>;
  readonly fields: readonly FormField[];
  readonly verb: string;
  /** The verb of something that cannot be undone is set apart. */
  readonly grave?: boolean;
  readonly plain?: boolean;
}

const EMPTY: FormState = { values: {} };

/** The form with its fields one below the other. */
export function InteractiveForm({ action, fields, verb, grave = false, plain = false }: Props) {
  const [state, send, isSending] = useActionState(action, EMPTY);
  const id = useId();
  return (
    <form action={send} className={plain ? 'flex flex-wrap items-end gap-x-3 gap-y-2' : 'grid max-w-105 gap-y-4'}>
      {fields.map((field) => (
        <FieldRow
          key={`${field.name} ${state.done ?? ''}`}
          field={field}
          typed={state.values[field.name]}
          fault={state.at === field.name ? state.fault : undefined}
          id={`${id}-${field.name}`}
        />
      ))}
      {state.fault !== undefined && !fields.some(({ name }) => name === state.at) && (
        <p role="alert" className="text-pick">
          {state.fault}
        </p>
      )}
      {state.done !== undefined && state.done !== '' && <p role="status">{state.done}</p>}
      <button
        type="submit"
        disabled={isSending}
        className={`min-h-11 cursor-pointer justify-self-start rounded-sm hover:underline disabled:opacity-60 ${styleOf(plain, grave)}`}
      >
        {isSending ? 'One moment …' : verb}
      </button>
    </form>
  );
}

/** Ink for what a form is for; an outline beside other things; vermilion for what cannot be undone. */
function styleOf(plain: boolean, grave: boolean): string {
  if (grave) return 'border border-pick px-4 text-pick';
  return plain ? 'border border-hair px-4' : 'bg-ink px-5 font-bold text-paper';
}
