/** Next calls this once in each process that serves; only a demo has stand-ins of hosted services. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs' || process.env.LEADLINE_FAKES !== '1') return;
  const { readEnv } = await import('./lib/env');
  const { startFakes } = await import('./lib/fakes/start');
  startFakes(readEnv().LEADLINE_DATA);
}
