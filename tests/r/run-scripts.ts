import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** Runs every script of a folder in an environment of its own; what one defines is not seen by the next. */
const DRIVER = String.raw`
for (file in sort(list.files(commandArgs(TRUE)[1], pattern = "^[0-9]+[.]R$", full.names = TRUE))) {
  cat("@script ", basename(file), "\n", sep = "")
  tryCatch(
    withCallingHandlers(
      source(file, local = new.env(parent = globalenv())),
      warning = function(problem) cat("@warning ", gsub("\n", " ", conditionMessage(problem)), "\n", sep = "")),
    error = function(problem) cat("@error ", gsub("\n", " ", conditionMessage(problem)), "\n", sep = ""))
}
`;

/** What one script printed, name by name, and what R complained of. */
export type Printed = { figures: ReadonlyMap<string, string>; complaints: readonly string[] };

/**
 * Runs R scripts, all in one process under the plain C locale.
 *
 * @throws Error when R itself ends badly
 */
export function runTogether(scripts: readonly string[]): Printed[] {
  return inFolder((folder) => {
    scripts.forEach((script, index) => writeFileSync(join(folder, fileName(index)), script));
    const driver = join(folder, 'driver.R');
    writeFileSync(driver, DRIVER);
    const output = rscript([driver, folder], { LC_ALL: 'C' });
    const printed = output
      .split(/^@script .*\n/m)
      .slice(1)
      .map(readPrinted);
    if (printed.length !== scripts.length) throw new Error(`R ran ${printed.length} of ${scripts.length}`);
    return printed;
  });
}

/** Runs one script as its reader would: `Rscript FILE`. */
export function runAlone(script: string): Printed {
  return inFolder((folder) => {
    const file = join(folder, fileName(0));
    writeFileSync(file, script);
    return readPrinted(rscript([file], {}));
  });
}

function inFolder<T>(work: (folder: string) => T): T {
  const folder = mkdtempSync(join(tmpdir(), 'r-scripts-'));
  try {
    return work(folder);
  } finally {
    rmSync(folder, { recursive: true });
  }
}

function fileName(index: number): string {
  return `${String(index).padStart(6, '0')}.R`;
}

function rscript(args: readonly string[], env: Record<string, string>): string {
  const { status, stdout, stderr } = spawnSync('Rscript', ['--vanilla', ...args], {
    encoding: 'utf8',
    env: { ...process.env, ...env },
    maxBuffer: 2 ** 28,
  });
  if (status !== 0) throw new Error(`Rscript ended with ${status}: ${stderr}`);
  return stdout;
}

function readPrinted(output: string): Printed {
  const figures = new Map<string, string>();
  const complaints: string[] = [];
  for (const line of output.split('\n').filter((text) => text !== '')) {
    const [, name, value] = /^([\w.-]+) = (.+)$/.exec(line) ?? [];
    if (name === undefined || value === undefined) complaints.push(line);
    else if (figures.has(name)) complaints.push(`${name} is printed twice`);
    else figures.set(name, value);
  }
  return { figures, complaints };
}
