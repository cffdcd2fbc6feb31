/** The public pages that the header leads to, in its order. A page is entered here when it exists. */
export const SITE_PAGES: readonly { readonly name: string; readonly href: string }[] = [
  { name: 'Reading', href: '/' },
  { name: 'Routes', href: '/routes' },
];
