/** The pages of the desk, in the order of their list. A page is entered here when it exists. */
export const DESK_PAGES: readonly { readonly name: string; readonly href: string; readonly isForOwners?: boolean }[] = [
  { name: 'Studies', href: '/studies' },
  { name: 'Members', href: '/members', isForOwners: true },
  { name: 'Keys', href: '/keys', isForOwners: true },
  { name: 'Log', href: '/audit', isForOwners: true },
  { name: 'Sessions', href: '/sessions' },
  { name: 'Settings', href: '/settings' },
];
