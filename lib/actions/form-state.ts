/** What an action says to the form that sent it. The forms of components/ know the same shape as theirs. */
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
