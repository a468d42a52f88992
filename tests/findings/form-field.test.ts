import { describe, expect, test } from 'vitest';
import { fieldOfCheckPath } from '@/lib/findings/form-field';

describe('the form field of a refusal of the engine', () => {
  test.each([
    ['release.shares[2].option', 'shares.2.option'],
    ['release.shares[12].pct', 'shares.12.printed'],
    ['release.shares[0]', 'shares.0.printed'],
    ['release.shares', 'shares'],
    ['release.n', 'n.value'],
    ['release.deff.value', 'deff.value'],
    ['release.deff.df', 'deff.df'],
    ['release.deff.source', 'deff.source'],
    ['release.deff', 'deff.value'],
    ['release.statedMargin.pp', 'statedMargin.pp'],
    ['release.statedMargin.unit', 'statedMargin.unit'],
    ['release.statedMargin.level', 'statedMargin.level'],
    ['release.statedMargin', 'statedMargin.pp'],
    ['release.modelledInterval.pp', 'modelledInterval.pp'],
    ['release.modelledInterval.unit', 'modelledInterval.unit'],
    ['release.modelledInterval.level', 'modelledInterval.level'],
    ['release.modelledInterval', 'modelledInterval.pp'],
  ])('%s stands at %s', (path, field) => {
    expect(fieldOfCheckPath(path)).toBe(field);
  });

  test.each([
    'previous.release.n',
    'previous.n',
    'release.nn',
    'release.n.value',
    'release.sharesx',
    'x.release.shares[0].option',
    'release.deff.valued',
    'release.deffs',
    'release.statedMargin.ppp',
    'release.statedMargins',
    'x.release.statedMargin',
    'x.release.deff',
    'release.modelledInterval.levels',
    'release.modelledIntervals',
    'x.release.modelledInterval.pp',
    '',
  ])('%j belongs to the form as a whole', (path) => {
    expect(fieldOfCheckPath(path)).toBe('');
  });
});
