/** `npm run test:reference`: holds the engine against reference figures, the project's own or those of REFERENCE_DIR. */
import { resolve } from 'node:path';
import { entries } from './adapter';
import { ownSet } from './reference-set';
import { printFile, printTotal } from './report';
import { runSet } from './run-set';

/** npm starts in the project's folder and leaves word of the folder it was called from. */
const calledFrom = process.env.INIT_CWD ?? process.cwd();
const other = process.env.REFERENCE_DIR;
const set = other ? resolve(calledFrom, other) : ownSet;

const { files, absent } = runSet(set, entries, { whole: !other });
const lines = [...files.map(printFile), ...absent.map((name) => `${name}.json: no file`), printTotal(files)];
process.stdout.write(`${lines.join('\n')}\n`);
process.exitCode = files.some((file) => file.faults.length > 0) ? 1 : 0;
