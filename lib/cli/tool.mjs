// @ts-check
/** `node lib/cli/tool.mjs FILE …`: installs what is missing, then runs one TypeScript tool of the repository. */
import { installIfChanged } from './install.mjs';
import { root, run } from './process.mjs';

process.chdir(root);
if (!(await installIfChanged())) process.exit(1);

const entry = ['--expose-gc', '--conditions=react-server', '--import', 'tsx'];
process.exit(await run(process.execPath, [...entry, ...process.argv.slice(2)]));
