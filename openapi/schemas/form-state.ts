/** What a form knows after it was sent. */
export interface FormState {
  /** Why it was refused. */
  readonly fault?: string;
  /** The field at fault. */
  readonly at?: string | undefined;
  /** What was done. */
  readonly done?: string;
  /** What was typed, to be shown again. */
  readonly values: Readonly<Record<string, string>>;
}

/** A field of a form. */
export interface FormField {
  readonly name: string;
  readonly label: string;
  readonly type?: 'text' | 'email' | 'password' | 'area' | 'choice' | 'hidden' | 'checks';
  readonly hint?: string;
  readonly value?: string;
  readonly autoComplete?: string;
  readonly choices?: readonly { readonly value: string; readonly label: string }[];
  readonly maxLength?: number;
  readonly optional?: boolean;
}
