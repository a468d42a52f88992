import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { findEvidence } from '@/db/queries/clearing';
import { listCurrentEvidenceOn } from '@/db/queries/corrections';
import { findRelease } from '@/db/queries/release';
import type { ReleaseFormValues } from '@/lib/domain/release-input';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { Actor } from '@/lib/domain/roles';
import { check } from '@/lib/findings/check';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import { findClaim } from '@/lib/findings/claim-key';
import { readDeskSettings } from '@/lib/services/setup/desk-settings';
import { canonicalJson } from '@/lib/security/canonical';
import { getRelease } from '@/lib/services/release/get-release';
import type { EvidenceBody } from '@/lib/services/sheet/evidence-body';
import { correctionDesk } from '@/tests/support/correction';
import { freshDatabase, makePerson, type TestDatabase } from '@/tests/support/database';
import { GOVERNOR, logRelease, sharesOf, typed } from '@/tests/support/release';
import { sheetDesk } from '@/tests/support/sheet';

const SEED = 20_261_201;
const shares = (alder: number, brook: number) =>
  sharesOf([
    ['Alder', String(alder)],
    ['Brook', String(brook)],
    ['Someone else', '4'],
    ['Don’t know', '6', false],
  ]);

let desk: TestDatabase;
let elsewhere: TestDatabase;
let stranger: Actor;
let raceElsewhere: ReleaseFormValues['race'] | null = null;
let corrections: ReturnType<typeof correctionDesk>;
let reporter: Actor;
let september: string;
let august: string;

/** Two waves of one series, with a lead, two changes and a lead without its method note in print. */
beforeAll(() => {
  desk = freshDatabase();
  elsewhere = freshDatabase();
  stranger = makePerson(elsewhere.db, { name: 'Rhea Quill', roles: ['reporter'] });
  corrections = correctionDesk(desk.db);
  const on = sheetDesk(desk.db);
  reporter = makePerson(desk.db, { name: 'Rhea Quill', roles: ['reporter'] });
  const editor = makePerson(desk.db, { name: 'Marten Reed', roles: ['editor'] });
  september = logRelease(desk.db, reporter, { shares: shares(47, 41) });
  const race = { kind: 'existing' as const, id: getRelease(reporter, september, desk.ctx()).facts.race.id };
  const dates = { fieldStartOn: '2026-08-13', fieldEndOn: '2026-08-16', publishedOn: '2026-08-19' };
  august = logRelease(desk.db, reporter, { ...dates, race, shares: shares(41, 45) });
  const claims: [release: string, claim: string, out: 'method-note'[]][] = [
    [september, 'lead:Alder|Brook', []],
    [september, 'change:Alder', []],
    [september, 'change:Brook', ['method-note']],
    [august, 'lead:Brook|Alder', ['method-note']],
  ];
  for (const [release, claim, out] of claims) {
    const sheet = on.draft(reporter, release, claim);
    on.file(reporter, sheet, {}, out);
    on.clear(editor, sheet);
  }
});
afterAll(() => {
  desk.closeAndRemove();
  elsewhere.closeAndRemove();
});

type Change = Partial<ReleaseFormValues>;
const anyChange: fc.Arbitrary<Change> = fc.oneof(
  fc.integer({ min: 600, max: 1400 }).map((n) => ({ n: typed(String(n)) })),
  fc.constant({ n: { notDisclosed: true, value: '' } }),
  fc
    .tuple(fc.integer({ min: 35, max: 50 }), fc.integer({ min: 30, max: 40 }))
    .map(([a, b]) => ({ shares: shares(a, b) })),
  fc.constantFrom('adults', 'registered-voters').map((population) => ({ population: typed(population) })),
  fc.constantFrom('online', 'mixed').map((mode) => ({ mode: typed(mode) })),
  fc.constantFrom('The Harbour Chronicle', 'The Vale Ledger').map((sponsor) => ({ sponsor: typed(sponsor) })),
  fc
    .integer({ min: 10, max: 30 })
    .map((deff) => ({ deff: { source: 'design' as const, value: (deff / 10).toFixed(1), df: '' } })),
  fc.integer({ min: 30, max: 50 }).map((pp) => ({
    statedMargin: { notDisclosed: false, pp: (pp / 10).toFixed(1), unit: '0.1', level: '95' },
  })),
  fc.constantFrom('Weighted by age.', 'Weighted by age and region.').map((methodNote) => ({ methodNote })),
  fc.constantFrom('a', 'b', 'c').map((page) => ({ sourceUrl: typed(`https://polls.example/${page}`) })),
  fc
    .constantFrom('If an election were held now, for whom would you vote?')
    .map((wording) => ({ wording: typed(wording) })),
);

/** From the frozen bytes alone: what was printed then against what would be printed from the corrected release. */
function mustGo(body: EvidenceBody, corrected: ReleaseFacts): boolean {
  const isOwn = body.release.releaseId === corrected.releaseId;
  const before = isOwn ? body.release : body.comparison.release!;
  const printsLink = isOwn && body.texts.some(({ kind }) => kind === 'method-note');
  const printed = ({ versionId: _, version: __, sourceUrl, ...facts }: ReleaseFacts) =>
    canonicalJson([facts, printsLink ? sourceUrl : null]);
  if (printed(before) !== printed(corrected)) return true;
  const release = isOwn ? corrected : body.release;
  const previous = isOwn ? body.comparison.release : corrected;
  const policy = readDeskSettings(desk.db, [release.sampleSource]).policy.body;
  const answer = check(checkDocumentOf(release, previous, policy));
  const shown = (from: typeof answer) => canonicalJson(findClaim(from, body.claimKey)?.finding ?? null);
  return shown(answer) !== shown(body.answer);
}

/** The corrected facts, as they would be stored: through the form, in a database of their own. */
function factsAfter(release: string, change: Change): ReleaseFacts {
  const { release: values } = corrections.asked(reporter, release, change);
  const race = raceElsewhere ?? GOVERNOR;
  const id = logRelease(elsewhere.db, stranger, { ...values, race });
  const { facts } = getRelease(stranger, id, elsewhere.ctx());
  raceElsewhere = { kind: 'existing', id: facts.race.id };
  return facts;
}

describe('whatever is corrected', () => {
  it('pulls exactly the words of which something printed differs', () => {
    let pulled = 0;
    let flagged = 0;
    fc.assert(
      fc.property(fc.constantFrom('september', 'august'), anyChange, (which, change) => {
        const id = which === 'september' ? september : august;
        const release = findRelease(desk.db, id, reporter, desk.ctx().now)!;
        const given = factsAfter(id, change);
        const now = getRelease(reporter, id, desk.ctx()).facts;
        const corrected: ReleaseFacts = {
          ...given,
          releaseId: now.releaseId,
          race: now.race,
          pollster: now.pollster,
          sponsor: sameName(given.sponsor, now.sponsor),
        };
        const expected = listCurrentEvidenceOn(desk.db, release.id).map(({ sheet, evidenceId }) => {
          const bytes = findEvidence(desk.db, evidenceId)!.bytes.toString('utf8');
          return [
            sheet.publicId,
            mustGo(JSON.parse(bytes) as EvidenceBody, corrected) ? 'pulled' : 'flagged',
          ];
        });
        const nothing =
          JSON.stringify({ ...corrected, versionId: '', version: 0 }) ===
          JSON.stringify({ ...now, versionId: '', version: 0 });
        fc.pre(!nothing || change.methodNote !== undefined);
        const { consequences } = corrections.preview(reporter, id, change);
        expect(consequences.map(({ sheetId, effect }) => [sheetId, effect])).toEqual(expected);
        pulled += consequences.filter(({ effect }) => effect === 'pulled').length;
        flagged += consequences.filter(({ effect }) => effect === 'flagged').length;
      }),
      { seed: SEED, numRuns: 20 },
    );
    expect(pulled).toBeGreaterThan(15);
    expect(flagged).toBeGreaterThan(2);
  }, 120_000);
});

/** Ids of names differ between two databases; the name decides. */
function sameName(given: ReleaseFacts['sponsor'], now: ReleaseFacts['sponsor']): ReleaseFacts['sponsor'] {
  return given.status === 'given' && now.status === 'given' && given.value.name === now.value.name
    ? now
    : given;
}
