import fc from 'fast-check';
import type { SoundingSpec } from '@/lib/charts/sounding-spec';

const name = fc.oneof(
  fc.constantFrom('Alder', 'Brook', 'Alliance for a Better Averil Coast', 'W', 'Ünïted Ḟront MMMM', '民主'),
  fc.string({ minLength: 1, maxLength: 60 }),
);

type Numbers = { estimatePp: number; halfPp: number; stretch: number; decimals: number; level: number };
type Shape = Pick<SoundingSpec, 'quantity' | 'verdict'> & { isTested: boolean; shorePct: number };

const numbers: fc.Arbitrary<Numbers> = fc.record({
  estimatePp: fc.double({ min: -100, max: 100, noNaN: true }),
  halfPp: fc.oneof(fc.constant(0), fc.double({ min: 0.01, max: 40, noNaN: true })),
  stretch: fc.double({ min: 1, max: 2, noNaN: true }),
  decimals: fc.integer({ min: 0, max: 3 }),
  level: fc.constantFrom(0.95, 0.99, 0.9, 0.8, 0.6, 0.999),
});

const shape: fc.Arbitrary<Shape> = fc.record({
  quantity: fc.constantFrom('lead', 'change', 'lead-change', 'threshold', 'share'),
  verdict: fc.constantFrom('holds', 'fragile', 'does-not-hold'),
  isTested: fc.boolean(),
  shorePct: fc.integer({ min: 1, max: 99 }),
});

/** Any quantity a release could give, with any names. */
export const randomSpec: fc.Arbitrary<SoundingSpec> = fc
  .tuple(numbers, shape, name, name)
  .map(([given, kind, first, second]) => build(given, kind, first, second));

function build(given: Numbers, kind: Shape, first: string, second: string): SoundingSpec {
  const isShare = kind.quantity === 'share';
  const isPct = isShare || kind.quantity === 'threshold';
  const estimatePp = isPct ? Math.abs(given.estimatePp) : given.estimatePp;
  const shorePp = isShare ? null : isPct ? kind.shorePct : 0;
  const clamp = (value: number) => (isPct ? Math.min(100, Math.max(0, value)) : value);
  const at = (half: number) => ({ lowPp: clamp(estimatePp - half), highPp: clamp(estimatePp + half) });
  const levels = [given.level, ...[0.8, 0.5].filter((level) => level < given.level)];
  return {
    quantity: kind.quantity,
    verdict: isShare ? null : kind.isTested ? kind.verdict : 'cannot-be-tested',
    label: `${first} minus ${second}`,
    name: first,
    estimatePp,
    decimals: given.decimals,
    bands: kind.isTested ? levels.map((level) => ({ level, ...at(given.halfPp * level) })) : [],
    far: kind.isTested && given.stretch > 1.2 ? at(given.halfPp * given.level * given.stretch) : null,
    shorePp,
    land: shorePp === null ? null : estimatePp < shorePp ? 'right' : 'left',
    sides: shorePp === null ? null : { left: `${second} ahead`, right: `${first} ahead` },
    untestedNote: kind.isTested ? null : 'No margin of sampling error',
  };
}
