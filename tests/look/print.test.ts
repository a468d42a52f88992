import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

const css = readFileSync('app/globals.css', 'utf8');

/** Opening tags of links whose whole text is the address they lead to. */
const addressLinks = ['app', 'components'].flatMap((folder) =>
  readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.tsx'))
    .flatMap((file) => readFileSync(`${folder}/${file}`, 'utf8').match(/<a\s[^>]*>\s*\{url\}/g) ?? []),
);

describe('on paper', () => {
  it('a link is followed by its address, unless it reads as one', () => {
    expect(css.match(/[^\n]*::after \{\s*content: ' \(' attr\(href\)/g)).toEqual([
      expect.stringContaining("a[href^='http']:not(.link-as-address)::after"),
    ]);
  });

  it('every link that reads as its address says so', () => {
    expect(addressLinks.length).toBeGreaterThanOrEqual(2);
    for (const link of addressLinks) expect(link).toContain('link-as-address');
  });
});
