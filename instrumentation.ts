/** Before the first request: settings that are missing, wrong or still placeholders stop the server with a sentence. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { refuseToStart } = await import('./lib/refuse-to-start');
  refuseToStart();
}
