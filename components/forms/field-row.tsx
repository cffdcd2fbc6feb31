/** One field of a form: label above, hint and fault below, all three joined for whoever listens. */
import type { FormField } from '@/openapi/schemas/form-state';

interface Props {
  readonly field: FormField;
  readonly typed: string | undefined;
  readonly fault: string | undefined;
  readonly id: string;
}

const BOX =
  'w-full min-h-11 rounded-sm border border-b-2 border-hair border-b-ink bg-raise px-3 py-2 text-[16px] aria-[invalid=true]:border-b-pick';

/** A field with what was typed, or else its value. */
export function FieldRow({ field, typed, fault, id }: Props) {
  const { name, label, type = 'text', hint, value = '', autoComplete, choices = [], maxLength, optional } = field;
  const shown = typed ?? value;
  if (type === 'hidden') return <input type="hidden" name={name} value={value} />;
  const about = [hint ? `${id}-hint` : '', fault ? `${id}-fault` : ''].filter(Boolean).join(' ') || undefined;
  const common = {
    id,
    name,
    required: !optional,
    'aria-invalid': fault !== undefined,
    'aria-describedby': about,
    className: BOX,
  };
  return (
    <div className="grid gap-y-1">
      {type === 'checks' ? (
        <fieldset className="grid gap-y-1">
          <legend className="mb-1">{label}</legend>
          {choices.map((choice) => (
            <label key={choice.value} className="flex min-h-8 items-center gap-x-2">
              <input type="checkbox" name={name} value={choice.value} defaultChecked={value.includes(choice.value)} />
              {choice.label}
            </label>
          ))}
        </fieldset>
      ) : (
        <label htmlFor={id} className="text-[13px] leading-5 font-medium">
          {label}
        </label>
      )}
      {type === 'area' && <textarea {...common} rows={4} maxLength={maxLength} defaultValue={shown} />}
      {type === 'choice' && (
        <select {...common} defaultValue={shown}>
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value}>
              {choice.label}
            </option>
          ))}
        </select>
      )}
      {(type === 'text' || type === 'email' || type === 'password') && (
        <input {...common} type={type} autoComplete={autoComplete} maxLength={maxLength} defaultValue={shown} />
      )}
      {hint && (
        <p id={`${id}-hint`} className="text-[14px] text-soft">
          {hint}
        </p>
      )}
      {fault && (
        <p id={`${id}-fault`} role="alert" className="text-pick">
          {fault}
        </p>
      )}
    </div>
  );
}
