/** Next calls this once in each process that serves; only a demo has stand-ins of hosted services. */
export async function register(): Promise<void> {
  // Written so that other runtimes than Node's leave the branch out of their bundles.
  if (process.env.NEXT_RUNTIME === 'nodejs') {
    if (process.env.LEADLINE_FAKES !== '1') return;
    const { readEnv } = await import('./lib/env');
    const { startFakes } = await import('./lib/fakes/start');
    startFakes(readEnv().LEADLINE_DATA);
  }
}
