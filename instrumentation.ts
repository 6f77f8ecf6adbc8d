/** Runs once when the server starts: a wrong configuration stops it here with a sentence. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { start } = await import('./lib/server/start');
  start();
}
