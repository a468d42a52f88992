import { describe, expect, it } from 'vitest';
import { parsePastedShares } from '@/lib/import/paste-shares';

const ALDER_BROOK = [
  { option: 'Alder', printed: '47' },
  { option: 'Brook', printed: '41' },
];

describe('pasted shares', () => {
  it.each([
    ['tabs', 'Alder\t47\nBrook\t41'],
    ['commas', 'Alder,47\nBrook,41'],
    ['commas and a space', 'Alder, 47\nBrook, 41'],
    ['semicolons', 'Alder;47\nBrook;41'],
    ['several spaces', 'Alder      47\nBrook      41'],
    ['one space', 'Alder 47\nBrook 41'],
    ['Windows line ends and empty lines', '\r\nAlder\t47\r\n\r\nBrook\t41\r\n'],
    ['percent signs', 'Alder\t47%\nBrook\t41 %'],
    ['no-break spaces', 'Alder\u00a0\u00a047\u202f%\nBrook\u00a0\u00a041\u202f%'],
    ['a heading line', 'Candidate\tShare\nAlder\t47\nBrook\t41'],
    ['a heading over spaces', 'Candidate\nAlder   47\nBrook   41'],
    ['a byte order mark', '\uFEFFAlder,47\nBrook,41'],
    ['numbers of rows before the names', '1\tAlder\t47\n2\tBrook\t41'],
    ['a second column of figures, which is left out', 'Alder\t47\t44\nBrook\t41\t43'],
    ['a closing total', 'Alder\t47\nBrook\t41\nTotal\t100'],
  ])('are read with %s', (_, text) => {
    expect(parsePastedShares(text)).toEqual(ALDER_BROOK);
  });

  it('keep the decimals that are printed, also after a comma', () => {
    const expected = [
      { option: 'Alder', printed: '47.0' },
      { option: 'Brook', printed: '41.5' },
    ];
    expect(parsePastedShares('Alder\t47,0 %\nBrook\t41,5 %')).toEqual(expected);
    expect(parsePastedShares('Alder;47,0\nBrook;41,5')).toEqual(expected);
    expect(parsePastedShares('Alder   47,0\nBrook   41,5')).toEqual(expected);
    expect(parsePastedShares('Alder,47.0\nBrook,41.5')).toEqual(expected);
    expect(parsePastedShares('Alder,"47,0"\nBrook,"41,5"')).toEqual(expected);
  });

  it('keep names with spaces, apostrophes and quoted commas whole', () => {
    expect(parsePastedShares('"Alder, M.",47\nDon’t know / refused,8')).toEqual([
      { option: 'Alder, M.', printed: '47' },
      { option: 'Don’t know / refused', printed: '8' },
    ]);
    expect(parsePastedShares('M. Alder   47\nSomeone else   4')[1]).toEqual({
      option: 'Someone else',
      printed: '4',
    });
  });

  it('leave a share empty that the table does not give', () => {
    expect(parsePastedShares('Alder\t47\nSomeone else\t–\nRefused\tn/a\nOther\t')).toEqual([
      { option: 'Alder', printed: '47' },
      { option: 'Someone else', printed: '' },
      { option: 'Refused', printed: '' },
      { option: 'Other', printed: '' },
    ]);
  });

  it('show what is no number as it stands, for the reporter to settle', () => {
    expect(parsePastedShares('Alder\t47\nSomeone else\t<1')[1]).toEqual({
      option: 'Someone else',
      printed: '<1',
    });
  });

  it('are none in a text without a table', () => {
    expect(parsePastedShares('')).toEqual([]);
    expect(parsePastedShares('Alder')).toEqual([]);
    expect(parsePastedShares('47')).toEqual([]);
    expect(parsePastedShares('If the vote were held today, for whom would you vote?')).toEqual([]);
  });
});
