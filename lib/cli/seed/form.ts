import type { ReleaseFormValues } from '@/lib/domain/release-input';

const DAY = 24 * 60 * 60_000;

/** The calendar day so many days before or after an instant, in UTC. */
export function dayFrom(now: number, days: number): string {
  return new Date(now + days * DAY).toISOString().slice(0, 10);
}

const typed = (value: string) => ({ notDisclosed: false, value });
export const withheld = { notDisclosed: true, value: '' };

type Shares = [option: string, printed: string, isAnswer?: false][];

export type DemoRelease = {
  race: ReleaseFormValues['race'];
  pollster: string;
  sponsor?: string | null;
  /** Interviewing, in days from the first start, both below or at zero. */
  field: [from: number, to: number];
  published?: number;
  n: string | null;
  shares: Shares;
  source?: ReleaseFormValues['sampleSource'];
  mode?: string;
  population?: string;
  design?: ReleaseFormValues['design'];
  deff?: ReleaseFormValues['deff'];
  margin?: string;
  modelled?: string;
  wording: string | null;
  embargo?: ReleaseFormValues['embargo'];
  note?: string;
  link?: string | null;
};

/** A demo release as the form would send it. */
export function formOf(release: DemoRelease, now: number): ReleaseFormValues {
  const { sponsor = 'The Averil Courier', link = 'https://polls.example/release' } = release;
  return {
    race: release.race,
    pollster: release.pollster,
    sponsor: sponsor === null ? withheld : typed(sponsor),
    population: typed(release.population ?? 'likely-voters'),
    sampleSource: release.source ?? 'probability',
    mode: typed(release.mode ?? 'live-telephone'),
    design: release.design ?? 'weighted',
    fieldStartOn: dayFrom(now, release.field[0]),
    fieldEndOn: dayFrom(now, release.field[1]),
    publishedOn: dayFrom(now, release.published ?? release.field[1] + 1),
    embargo: release.embargo ?? null,
    n: release.n === null ? withheld : typed(release.n),
    deff: release.deff ?? { source: '', value: '', df: '' },
    statedMargin: { notDisclosed: false, pp: release.margin ?? '', unit: '0.1', level: '95' },
    modelledInterval: { pp: release.modelled ?? '', unit: '0.1', level: '95' },
    wording: release.wording === null ? withheld : typed(release.wording),
    sameQuestion: false,
    shares: release.shares.map(([option, printed, isAnswer = true]) => ({
      option,
      printed,
      notDisclosed: false,
      isAnswer,
    })),
    sourceUrl: link === null ? withheld : typed(link),
    methodNote: release.note ?? '',
  };
}
