import type { Cue } from '../phrases';
import { DE_AFTER_CLAUSE } from './de-leads';
import { listed } from './listed';
import type { CueGroup } from './types';

type Groups =
  | 'forecast'
  | 'proof'
  | 'shows'
  | 'subgroup'
  | 'amongst'
  | 'wholeSample'
  | 'everybody'
  | 'people'
  | 'voters'
  | 'likelyVoters'
  | 'registeredVoters'
  | 'adults';

const each = (starts: readonly string[], ends: readonly string[]) =>
  starts.flatMap((start) => ends.map((end) => `${start} ${end}`));
const GROUPS = listed(`
  wähler | wählern | wählerinnen | frauen | männer | männern | menschen | erwachsenen | erwachsene | befragten |
  leute | leuten | bürger | bürgern`);
const KINDS = listed(`
  jung | jünger | alt | älter | weiblich | männlich | ländlich | städtisch | arbeitslos | verheiratet | berufstätig |
  unentschlossen | arm | wohlhabend | gebildet | nördlich | südlich`);
const inflected = (stems: readonly string[]) =>
  stems.flatMap((stem) => [`${stem}e`, `${stem}en`, `${stem}er`]);
const VOTERS = listed(
  `wähler | wählern | wählerinnen | wählerinnen und wähler | wählerinnen und wählern | wählende | wählenden`,
);
const likely = (stem: string) => each([stem, `${stem}e`, `${stem}en`, `${stem}er`], VOTERS);

/** German: what polls are said to do, and who was asked. */
export const DE_POLLS: Readonly<Record<Extract<CueGroup, Groups>, readonly Cue[]>> = {
  forecast: [
    {
      say: listed(`wird | werden | würde | würden | dürfte | dürften`),
      then: listed(`
        gewinnen | siegen | verlieren | unterliegen | regieren | triumphieren | gewählt werden | abgewählt werden`),
      thenBefore: DE_AFTER_CLAUSE,
    },
    {
      say: listed(`wird | würde`),
      before: listed(`neue | neuer | nächste | nächster | gouverneurin | gouverneur`),
    },
    {
      say: listed(`
      nächste gouverneurin | nächster gouverneur | künftige gouverneurin | künftiger gouverneur |
      auf siegeskurs | auf dem weg zum sieg | auf dem weg zur macht | vor dem wahlsieg | vor einem sieg |
      vor einem wahlsieg | sieg nicht mehr zu nehmen | sieg sicher | steht als sieger fest | wahlsieg sicher |
      sicherer sieger | sichere siegerin | erdrutschsieg | nicht mehr einzuholen | uneinholbar | so gut wie gewählt |
      wird die wahl gewinnen | gewinnt die wahl | verliert die wahl | schon gewonnen | wahlsieg zeichnet sich ab |
      vor der abwahl | steuert auf einen sieg zu`),
    },
    { say: listed(`prognostiziert | prophezeit | vorausgesagt | vorhergesagt`) },
    { say: listed(`sagt | sagen`), then: ['voraus', 'vorher'], thenBefore: DE_AFTER_CLAUSE },
  ],
  proof: [
    {
      say: listed(`
      beweist | beweisen | bewies | bewiesen | beweis | belegt | belegen | belegte | bestätigt | bestätigen |
      bestätigte | steht fest | lässt keinen zweifel | außer zweifel`),
    },
    { say: ['stellt', 'stellte'], then: ['klar'], thenBefore: DE_AFTER_CLAUSE },
  ],
  shows: [{ say: listed(`zeigt | zeigen | zeigte | zeigten | offenbart`), notBefore: listed(`sich | mit`) }],
  subgroup: [
    {
      say: [
        ...each(inflected(KINDS), GROUPS),
        ...listed(`
        frauen | männer | männern | rentner | rentnern | rentnerinnen | studierende | studierenden | akademiker |
        akademikern | junge | jungen leuten | jüngeren | älteren | erstwähler | erstwählern | erstwählerinnen |
        arbeiter | arbeitern | selbstständige | selbstständigen | landbevölkerung | stadtbevölkerung | eltern |
        hausbesitzer | mieter | mietern | pendler | pendlern | unter 30 jährigen | über 60 jährigen | 18 bis 29 jährigen`),
      ],
    },
  ],
  amongst: [],
  wholeSample: [],
  everybody: [
    {
      say: listed(`
      die bevölkerung | der bevölkerung | die öffentlichkeit | das ganze land | das land | die bürger |
      bürgerinnen und bürger | die einwohner | der einwohner | die menschen in | der menschen in`),
      notBefore: listed(`die | das`),
    },
  ],
  people: [
    {
      say: listed(`menschen | leute`),
      after: listed(`der | prozent | % | meisten`),
      notBefore: listed(`befragt | wurden | die`),
    },
  ],
  voters: [
    {
      say: [
        ...VOTERS,
        'wähler',
        'wahlberechtigte',
        'wahlberechtigten',
        'wahlberechtigter',
        'stimmberechtigten',
      ],
      notAfter: listed(`
        voraussichtliche | voraussichtlichen | voraussichtlicher | voraussichtlich | wahrscheinliche | wahrscheinlichen |
        wahrscheinlicher | registrierte | registrierten | registrierter | eingetragene | eingetragenen`),
    },
  ],
  likelyVoters: [{ say: [...likely('voraussichtlich'), ...likely('wahrscheinlich')] }],
  registeredVoters: [
    {
      say: [
        ...each(
          listed(
            `registrierte | registrierten | registrierter | eingetragene | eingetragenen | eingetragener`,
          ),
          VOTERS,
        ),
        ...listed(`
        ins wählerverzeichnis eingetragene | ins wählerverzeichnis eingetragenen | ins wählerverzeichnis eingetragener`),
      ],
    },
  ],
  adults: [
    {
      say: listed(`erwachsene | erwachsenen | erwachsener | volljährige | volljährigen`),
      notBefore: ['bildung'],
    },
  ],
};
