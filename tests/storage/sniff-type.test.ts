import { describe, expect, it } from 'vitest';
import { sniffType } from '@/lib/storage/sniff-type';

const bytes = (text: string) => Buffer.from(text, 'latin1');

describe('what a file is', () => {
  it.each([
    ['%PDF-1.7 …', 'application/pdf'],
    ['\x89PNG\r\n\x1a\n…', 'image/png'],
    ['\xff\xd8\xff\xe0', 'image/jpeg'],
    ['RIFF\0\0\0\0WEBPVP8 ', 'image/webp'],
    ['PK\x03\x04\x14\0xl/workbook.xml', 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet'],
    ['Alder,47\r\nBrook,41\r\n', 'text/plain'],
  ])('is read from its bytes: %j', (text, type) => {
    expect(sniffType(bytes(text))).toBe(type);
  });

  it.each(['', 'PK\x03\x04\x14\0evil.exe', 'MZ\x90\0', '\xff\xfe', '<!DOCTYPE html>', ' <svg onload=x>'])(
    'is nothing that the desk keeps: %j',
    (text) => {
      expect(sniffType(bytes(text))).toBeNull();
    },
  );
});
