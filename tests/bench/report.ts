import { slope, type Point } from './measure';

/** What one run found: printed as it comes, counted at the end. */
export class Report {
  missed: string[] = [];
  wrong: string[] = [];

  say(text: string): void {
    process.stdout.write(`${text}\n`);
  }

  title(text: string): void {
    this.say(`\n${text}`);
  }

  time(name: string, seconds: number): void {
    this.say(`  ${name.padEnd(62)} ${printSeconds(seconds)}`);
  }

  /** A ratio against R, and whether it meets what is aimed at. */
  aim(name: string, ratio: number, limit: number, kind: 'at least' | 'at most'): void {
    const isMet = kind === 'at least' ? ratio >= limit : ratio <= limit;
    if (!isMet) this.missed.push(name);
    this.say(
      `  ${name.padEnd(62)} ${ratio.toFixed(2)} times (aim: ${kind} ${limit}) ${isMet ? 'met' : 'MISSED'}`,
    );
  }

  growth(name: string, points: readonly Point[], limit: number): void {
    const found = slope(points);
    if (found > limit) this.missed.push(name);
    const sizes = points.map(({ size, seconds }) => `${size}: ${printSeconds(seconds).trim()}`).join(', ');
    this.say(`  ${name}: ${sizes}`);
    this.say(
      `    slope on log-log ${found.toFixed(2)} (aim: at most ${limit}) ${found <= limit ? 'met' : 'MISSED'}`,
    );
  }

  /** Fails the run unless both sides gave the same figure. */
  same(name: string, ours: number, theirs: number, tolerance: number): void {
    const apart = Math.abs(ours - theirs);
    if (apart <= tolerance * Math.max(Math.abs(theirs), 1e-3)) return;
    this.wrong.push(name);
    this.say(`  WRONG ${name}: ${ours}, R has ${theirs}`);
  }

  /** The exit status: wrong figures fail always, missed aims only when strict. */
  end(isStrict: boolean): number {
    this.title('Summary');
    this.say(`  figures unlike R's: ${this.wrong.length === 0 ? 'none' : this.wrong.join('; ')}`);
    this.say(`  aims missed: ${this.missed.length === 0 ? 'none' : this.missed.join('; ')}`);
    return this.wrong.length > 0 || (isStrict && this.missed.length > 0) ? 1 : 0;
  }
}

function printSeconds(seconds: number): string {
  if (seconds < 1e-3) return `${(seconds * 1e6).toFixed(1).padStart(9)} µs`;
  return `${(seconds * 1e3).toFixed(2).padStart(9)} ms`;
}
