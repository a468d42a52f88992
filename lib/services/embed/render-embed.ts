import 'server-only';
import { embedDocument } from '@/lib/charts/embed-document';
import type { Dated } from '@/lib/charts/embed-input';
import { sceneToSvg } from '@/lib/charts/scene-to-svg';
import type { ThemeChoice } from '@/lib/charts/tokens';
import { withdrawalDocument } from '@/lib/charts/withdrawal-document';
import { valueOf } from '@/lib/domain/disclosed';
import { pctOf, type ReleaseFacts } from '@/lib/domain/release-facts';
import type { LineKind } from '@/lib/domain/sheet';
import { POPULATION_NAMES } from '@/lib/domain/vocabulary';
import { readEnv } from '@/lib/env';
import { findClaim } from '@/lib/findings/claim-key';
import { formatDayRange, formatInstant } from '@/lib/format/date';
import { formatCount } from '@/lib/format/number';
import { canonicalJson } from '@/lib/security/canonical';
import type { EvidenceBody } from '../sheet/evidence-body';

type Subject = { evidence: EvidenceBody; id: string; version: number; at: number };

const LOCALE = 'en-GB';

/** The page of an embed, from its evidence alone. */
export function pageOf({ evidence, version, at }: Subject, theme: ThemeChoice): string {
  const { release, chart } = evidence;
  return embedDocument({
    lang: evidence.language,
    theme,
    chartTitle: textOf(evidence, 'chart-title'),
    particulars: particularsOf(release),
    altText: textOf(evidence, 'alt-text'),
    sounding: chart.spec,
    rows: chart.rows,
    caveat: textOf(evidence, 'caveat'),
    version,
    updated: dated(at),
    source: { text: release.pollster.name, url: valueOf(release.sourceUrl) },
  });
}

export function pictureOf({ evidence }: Subject, theme: ThemeChoice): string {
  const scene = {
    ...evidence.chart.scene,
    title: textOf(evidence, 'chart-title'),
    description: textOf(evidence, 'alt-text'),
  };
  return sceneToSvg(scene, { theme, idPrefix: 'chart' });
}

/** The same figures for machines, with what they stand on. */
export function dataOf({ evidence, id, version, at }: Subject): string {
  const { release, answer, document } = evidence;
  const shares = answer.findings.filter((finding) => finding.kind === 'share');
  return canonicalJson({
    id,
    version,
    cleared: new Date(at).toISOString(),
    language: evidence.language,
    engine: evidence.engine,
    title: textOf(evidence, 'chart-title'),
    altText: textOf(evidence, 'alt-text'),
    caveat: textOf(evidence, 'caveat'),
    race: release.race.name,
    pollster: release.pollster.name,
    sponsor: valueOf(release.sponsor)?.name ?? null,
    population: valueOf(release.population),
    sampleSource: release.sampleSource,
    mode: valueOf(release.mode),
    fieldStartOn: release.fieldStartOn,
    fieldEndOn: release.fieldEndOn,
    n: valueOf(release.n),
    level: document.policy?.level ?? null,
    base: answer.base,
    finding: findClaim(answer, evidence.claimKey)?.finding ?? null,
    shares: release.shares.map((share) => ({
      option: share.option,
      isAnswer: share.isAnswer,
      pct: share.units === null ? null : pctOf(share.units, release.decimals),
      intervalPct: shares.find(({ option }) => option === share.option)?.intervalPct ?? null,
    })),
    source: valueOf(release.sourceUrl),
  });
}

/** What stands where a chart was, in the form that was asked for. */
export function withdrawalOf(
  part: 'page' | 'chart.svg' | 'data.json',
  at: number,
  theme: ThemeChoice,
  note: string | null,
): string {
  const withdrawn = dated(at);
  if (part === 'data.json')
    return canonicalJson({ withdrawn: true, at: withdrawn.iso, ...(note === null ? {} : { note }) });
  if (part === 'page') return withdrawalDocument({ lang: 'en', theme, withdrawn, note });
  return [
    '<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 640 60" width="640" height="60" role="img">',
    `<title>This chart was withdrawn on ${withdrawn.text}</title>`,
    '<text x="0" y="36" font-family="system-ui, sans-serif" font-size="15" fill="#4a5c66">',
    `This chart was withdrawn on ${withdrawn.text}</text></svg>`,
  ].join('');
}

function textOf({ texts }: EvidenceBody, kind: LineKind): string {
  return texts.find((line) => line.kind === kind)?.text ?? '';
}

function particularsOf(release: ReleaseFacts): string {
  const n = valueOf(release.n);
  const population = valueOf(release.population);
  const who = population ? POPULATION_NAMES[population].toLowerCase() : 'people';
  return [
    release.race.name,
    n === null ? `${who}, sample size not disclosed` : `${formatCount(n, LOCALE)} ${who}`,
    formatDayRange(release.fieldStartOn, release.fieldEndOn, LOCALE),
    release.pollster.name,
  ].join(', ');
}

function dated(at: number): Dated {
  const { LEADLINE_ZONE } = readEnv();
  return { iso: new Date(at).toISOString(), text: formatInstant(at, LEADLINE_ZONE, LOCALE) };
}
