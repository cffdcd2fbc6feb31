/** What somebody new is asked for, behind a link that proved the address. */
import type { FormField } from '@/openapi/schemas/form-state';

/** Name and password, and what the link carries. */
export function newAccountFields(hidden: Readonly<Record<string, string>>): readonly FormField[] {
  return [
    { name: 'name', label: 'Your name, as others see it', autoComplete: 'name', maxLength: 80 },
    {
      name: 'password',
      label: 'Password',
      type: 'password',
      autoComplete: 'new-password',
      maxLength: 200,
      hint: 'Ten characters or more. A few words in a row are good ones.',
    },
    ...Object.entries(hidden).map(([name, value]) => ({ name, label: '', type: 'hidden', value }) as const),
  ];
}
