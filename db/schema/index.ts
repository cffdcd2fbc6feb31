/** The whole schema: every table, for the client and for drizzle-kit. */
export * from './accounts';
export * from './games';
export * from './jobs';
export * from './keys';
export * from './mail';
export * from './results';
export * from './studies';
export * from './workspaces';
