import type { Language } from '@/lib/domain/vocabulary';
import { typesetFrench } from './messages/fr-typeset';

/** What a sheet of figures as printed says. Whole sentences in ICU MessageFormat; none compares or judges. */
export type AsPrintedMessages = {
  headline: string;
  body: string;
  sponsor: string;
  sample: string;
  margin: string;
  missing: string;
  standing: string;
};

/** Contents: common practice for figures that nobody has worked on yet, no source. */
const EN_AS_PRINTED: AsPrintedMessages = {
  headline:
    '{short, select, yes {{race}, {pollster}: {answers}} other {{race}: the figures of {pollster} as printed}}',
  body: '{pollsterStart} surveyed {sized, select, yes {{n} {population}} other {{population}}}{modeKnown, select, yes { {mode}} other {}} {dateSpan, select, wider {from {start} to {end}} other {on {dates}}}. As printed: {shares}.',
  sponsor:
    '{sponsored, select, given {The poll was made for {sponsor}.} own {{pollsterStart} made the poll on its own account.} other {Who paid for the poll is not known.}}',
  sample:
    '{random, select, yes {The sample was drawn at random.} other {{drawn, select, unknown {How the sample was drawn is not stated.} other {The sample was not drawn at random ({sample}).}}}}',
  margin:
    '{stated, select, given {{pollsterStart} states ±{statedPp} {statedCount, plural, one {point} other {points}} for a share at {statedLevel} confidence.} other {{pollsterStart} states no margin.}}',
  missing: 'Not disclosed or not recorded: {items}.',
  standing:
    'These are the figures of {pollster} as printed; {newsroom} has not worked out yet what they support.',
};

const ES_AS_PRINTED: AsPrintedMessages = {
  headline:
    '{short, select, yes {{race}, {pollster}: {answers}} other {{race}: las cifras de {pollster}, tal como se publicaron}}',
  body: '{pollsterStart} encuestó a {sized, select, yes {{n} {population}} other {{population}}}{modeKnown, select, yes { {mode}} other {}} {dateSpan, select, day {el {end}} other {{dates}}}. Tal como se publicó: {shares}.',
  sponsor:
    '{sponsored, select, given {El sondeo se hizo por encargo de {sponsor}.} own {{pollsterStart} hizo el sondeo por iniciativa propia.} other {No se sabe quién pagó el sondeo.}}',
  sample:
    '{random, select, yes {La muestra se eligió al azar.} other {{drawn, select, unknown {No se indica cómo se eligió la muestra.} other {La muestra no se eligió al azar ({sample}).}}}}',
  margin:
    '{stated, select, given {{pollsterStart} declara ±{statedPp} {statedCount, plural, one {punto} other {puntos}} para un porcentaje con una confianza del {statedLevel}.} other {{pollsterStart} no declara ningún margen.}}',
  missing: 'Sin difundir o sin registrar: {items}.',
  standing:
    'Son las cifras de {pollster} tal como se publicaron; {newsroom} aún no ha determinado qué permiten afirmar.',
};

const FR_AS_PRINTED: AsPrintedMessages = typesetFrench({
  headline:
    '{short, select, yes {{race}, {pollster} : {answers}} other {{race} : les chiffres de {pollster} tels que publiés}}',
  body: '{pollsterStart} a interrogé {sized, select, yes {{n} {population}} other {des {population}}}{modeKnown, select, yes { {mode}} other {}} {dateSpan, select, day {le {end}} other {{dates}}}. Chiffres tels que publiés : {shares}.',
  sponsor:
    '{sponsored, select, given {Le sondage a été réalisé pour {sponsor}.} own {{pollsterStart} a réalisé le sondage pour son propre compte.} other {On ignore qui a payé le sondage.}}',
  sample:
    '{random, select, yes {L’échantillon a été tiré au sort.} other {{drawn, select, unknown {Le mode de tirage de l’échantillon n’est pas indiqué.} other {L’échantillon n’a pas été tiré au sort ({sample}).}}}}',
  margin:
    '{stated, select, given {{pollsterStart} annonce ±{statedPp} {statedCount, plural, one {point} other {points}} pour un pourcentage au niveau de confiance de {statedLevel}.} other {{pollsterStart} n’annonce aucune marge.}}',
  missing: 'Non communiqué ou non relevé : {items}.',
  standing:
    'Ce sont les chiffres de {pollster} tels que publiés ; {newsroom} n’a pas encore établi ce qu’ils permettent d’affirmer.',
});

const DE_AS_PRINTED: AsPrintedMessages = {
  headline:
    '{short, select, yes {{race}, {pollster}: {answers}} other {{race}: die Werte von {pollster}, wie veröffentlicht}}',
  body: '{pollsterStart} befragte {dateSpan, select, day {am {end}} other {{dates}}} {sized, select, yes {{n} {population}} other {{population}}}{modeKnown, select, yes { {mode}} other {}}. Wie veröffentlicht: {shares}.',
  sponsor:
    '{sponsored, select, given {Die Umfrage entstand im Auftrag von {sponsor}.} own {{pollsterStart} machte die Umfrage auf eigene Rechnung.} other {Wer die Umfrage bezahlt hat, ist nicht bekannt.}}',
  sample:
    '{random, select, yes {Die Stichprobe wurde zufällig gezogen.} other {{drawn, select, unknown {Wie die Stichprobe gezogen wurde, ist nicht angegeben.} other {Die Stichprobe wurde nicht zufällig gezogen ({sample}).}}}}',
  margin:
    '{stated, select, given {{pollsterStart} gibt ±{statedPp} {statedCount, plural, one {Prozentpunkt} other {Prozentpunkte}} für einen Anteil an (bei {statedLevel} Sicherheit).} other {{pollsterStart} gibt keine Fehlerspanne an.}}',
  missing: 'Nicht veröffentlicht oder nicht erfasst: {items}.',
  standing:
    'Das sind die Werte von {pollster}, wie sie veröffentlicht wurden; {newsroom} hat noch nicht geprüft, was sie stützen.',
};

export const AS_PRINTED_MESSAGES: Record<Language, AsPrintedMessages> = {
  en: EN_AS_PRINTED,
  es: ES_AS_PRINTED,
  fr: FR_AS_PRINTED,
  de: DE_AS_PRINTED,
};
