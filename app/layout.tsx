/** Every page's document: letters, tokens, and the theme set before anything is painted. */
import type { Metadata, Viewport } from 'next';
import { headers } from 'next/headers';
import type { ReactNode } from 'react';
import { THEME_SCRIPT } from '@/components/ui/theme';
import '@fontsource/roboto-slab/latin-300.css';
import '@fontsource/roboto-slab/latin-400.css';
import '@fontsource/roboto-slab/latin-500.css';
import '@fontsource/roboto-slab/latin-700.css';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Waypost: where the pieces belong', template: '%s · Waypost' },
  description:
    'A reading of any chess position, square by square, in sentences one can check with a finger on the board.',
  applicationName: 'Waypost',
};

export const viewport: Viewport = {
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#fbf8f1' },
    { media: '(prefers-color-scheme: dark)', color: '#141a26' },
  ],
};

export default async function RootLayout({ children }: { readonly children: ReactNode }) {
  // Reading the headers makes every page dynamic, as a nonce that is new each time asks for.
  const nonce = (await headers()).get('x-nonce') ?? undefined;
  return (
    // The script may set data-theme before React looks.
    <html lang="en" suppressHydrationWarning>
      <head>
        <script nonce={nonce} suppressHydrationWarning dangerouslySetInnerHTML={{ __html: THEME_SCRIPT }} />
      </head>
      <body className="flex min-h-dvh flex-col">{children}</body>
    </html>
  );
}
