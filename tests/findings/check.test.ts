import { describe, expect, test } from 'vitest';
import { check } from '@/lib/findings/check';
import type { CheckDocument } from '@/lib/findings/check-types';
import cases from '../reference/findings/cases.json';
import { differences } from './agreement';

describe('check answers the reference documents', () => {
  test.each(cases.map((one) => [one.id, one] as const))(
    '%s agrees in every key',
    (_id, { input, expected }) => {
      const answer = check(input as unknown as CheckDocument);
      expect(differences({ ...answer, engine: null }, { ...expected, engine: null })).toEqual([]);
    },
  );
});
