// @ts-check
import { installIfChanged } from './install.mjs';
import { root, run } from './process.mjs';

process.chdir(root);
if (!(await installIfChanged())) process.exit(1);

const entry = ['--conditions=react-server', '--import', 'tsx', 'lib/cli/dev-server.ts'];
process.exit(
  await run(process.execPath, [...entry, ...process.argv.slice(2)], {
    env: { NODE_ENV: 'development', NEXT_TELEMETRY_DISABLED: '1' },
  }),
);
