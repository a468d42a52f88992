import { describe, expect, it } from 'vitest';
import { admitsNode, aptCommand, findHeaders, isInstalled } from '@/lib/cli/toolchain.mjs';

describe('the tools a start needs', () => {
  it('admit the Node that package.json names and no other', () => {
    const admitted = (version: string) => admitsNode('>=20.20 <21', version);
    expect(admitted('20.20.0')).toBe(true);
    expect(admitted('20.21.3')).toBe(true);
    expect(admitted('20.19.9')).toBe(false);
    expect(admitted('21.0.0')).toBe(false);
    expect(admitted('18.20.0')).toBe(false);
  });

  it('admit nothing by a rule they cannot read', () => {
    expect(admitsNode('^20', '20.20.0')).toBe(false);
  });

  it('are found by name', () => {
    expect(isInstalled('sh')).toBe(true);
    expect(isInstalled('no-such-command-here')).toBe(false);
  });

  it('include the headers of this very Node', () => {
    expect(findHeaders()).toMatch(/^\//);
  });

  it('are named as one command that can be pasted', () => {
    expect(aptCommand(['make', 'g++'])).toBe('apt-get update && apt-get install -y make g++');
  });
});
