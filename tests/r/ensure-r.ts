import { aptCommand, isInstalled } from '@/lib/cli/toolchain.mjs';
import { run, say } from '@/lib/cli/process.mjs';

const PACKAGES = ['r-base-core'];

/** Whether R is here, installed through apt when root and it was not; says what to do where it is not. */
export async function ensureR(): Promise<boolean> {
  if (isInstalled('Rscript')) return true;
  if (process.getuid?.() === 0 && isInstalled('apt-get')) {
    say(`Installing ${PACKAGES.join(', ')} through apt`);
    await run('sh', ['-c', aptCommand(PACKAGES)], { env: { DEBIAN_FRONTEND: 'noninteractive' } });
    if (isInstalled('Rscript')) return true;
  }
  say(`The scripts of findings need R (Rscript). Run: ${aptCommand(PACKAGES)}`);
  return false;
}
