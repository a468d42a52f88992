// @ts-check
import { buildIfChanged } from './build.mjs';
import { demoFakes } from './demo-fakes.mjs';
import { installIfChanged } from './install.mjs';
import { root, run } from './process.mjs';
import { serveArguments } from './serve-arguments.mjs';

process.chdir(root);
if (!(await installIfChanged()) || !(await buildIfChanged())) process.exit(1);

process.exit(
  await run(process.execPath, serveArguments(process.argv.slice(2)), {
    env: { NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1', ...demoFakes(process.argv.slice(2)) },
  }),
);
