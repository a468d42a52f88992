import { valueOf } from '@/lib/domain/disclosed';
import { nameOf, printFigure } from './claim-slots';
import { sayAll, type Draft } from './draft';
import { namesOf } from './draft-finding';
import { figureOf, type Corrected, type Figure } from './draft-input';
import { isolated } from './names';
import { printCount } from './print';
import { printDay, printDays } from './release-slots';
import type { Slots } from './say';
import { claimMessage, wordingState, VERDICT_OF_STATE } from './wording-state';
import type { CorrectionSentence } from './language-pack';
import type { Verdict } from '@/lib/findings/check-types';

type Item = { key: CorrectionSentence; slots: Slots };

/** What was wrong, what is right, and what the right figures support: dated, one sentence for each. */
export function draftCorrection(draft: Draft): string {
  const { input, pack, voice, state } = draft;
  const { corrected, finding } = input;
  if (!corrected) throw new RangeError('draftLine requires what stood in print before');
  const items = [...figureItems(draft, corrected), ...particularItems(draft, corrected)];
  const line = sayAll([claimMessage(pack.told, finding.kind, state)], draft);
  const isWeaker =
    rank(VERDICT_OF_STATE[state]) < rank(VERDICT_OF_STATE[wordingState(corrected.was.finding)]);
  return [
    sayAll([pack.correction.intro], draft, {
      on: printDay(corrected.on, true, voice),
      count: items.length,
    }),
    ...items.map(({ key, slots }) => sayAll([pack.correction[key]], draft, slots)),
    ...(isWeaker && items.length > 0 ? [sayAll([pack.correction.weaker], draft)] : []),
    sayAll([pack.correction.now], draft, { line, count: items.length }),
  ].join(' ');
}

const RANKS: readonly Verdict[] = ['cannot-be-tested', 'does-not-hold', 'fragile', 'holds'];
const rank = (verdict: Verdict) => RANKS.indexOf(verdict);

function figureItems(draft: Draft, { was }: Corrected): Item[] {
  const { input, voice } = draft;
  const differing = (key: CorrectionSentence, before: Figure | null, now: Figure | null, extra: Slots) =>
    isSame(before, now)
      ? []
      : [{ key, slots: { ...extra, was: printFigure(before, voice), is: printFigure(now, voice) } }];
  if (input.finding.kind === 'gap') {
    return (input.beside?.groups ?? []).flatMap((group) => {
      const before = was.beside?.groups?.find(({ name }) => name === group.name);
      const named = group.name === '' ? draft.pack.terms.everyoneElse : isolated(group.name);
      return differing('group-share', before?.figure ?? null, group.figure, { group: named });
    });
  }
  return namesOf(input.finding).flatMap((name) => {
    const option = nameOf(name, input, voice);
    return [
      ...differing('share', figureOf(name, was, 'now'), figureOf(name, input, 'now'), { option }),
      ...(input.previous && was.previous
        ? differing('earlier-share', figureOf(name, was, 'then'), figureOf(name, input, 'then'), { option })
        : []),
    ];
  });
}

function particularItems({ input, voice }: Draft, { was }: Corrected): Item[] {
  const [before, now] = [was.release, input.release];
  const [wasN, isN] = [valueOf(before.n), valueOf(now.n)];
  const dates = ({ fieldStartOn, fieldEndOn }: typeof now) =>
    printDays(fieldStartOn, fieldEndOn, false, voice);
  return [
    ...(wasN === isN
      ? []
      : [
          {
            key: 'sample-size' as const,
            slots: {
              wasSized: wasN === null ? 'no' : 'yes',
              isSized: isN === null ? 'no' : 'yes',
              was: wasN === null ? '' : printCount(wasN, voice),
              is: isN === null ? '' : printCount(isN, voice),
            },
          },
        ]),
    ...(before.fieldStartOn === now.fieldStartOn && before.fieldEndOn === now.fieldEndOn
      ? []
      : [{ key: 'dates' as const, slots: { was: dates(before), is: dates(now) } }]),
  ];
}

/** Whether two figures print alike. */
function isSame(one: Figure | null, other: Figure | null): boolean {
  return one?.units === other?.units && one?.decimals === other?.decimals;
}
