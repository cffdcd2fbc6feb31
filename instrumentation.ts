/** What Next runs once, before it answers: the database opened and migrated, and its closing arranged. */

/** Opens what the server needs. A failure ends the server: one without its database would answer nothing right. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME === 'nodejs') {
    const { startServer } = await import('@/lib/start');
    await startServer();
  }
}
