import {
  CLAIM_NAMES,
  decisionName,
  LANGUAGE_NAMES,
  PART_NAMES,
  sampleName,
  stateName,
  valueWords,
} from '@/components/forms/house-style/decision-words';
import { DefinitionList } from '@/components/ui/definition-list';
import { Details } from '@/components/ui/details';
import { SectionHeading } from '@/components/ui/section-heading';
import { NOT_RANDOM } from '@/lib/domain/house-style';
import { LANGUAGES } from '@/lib/domain/vocabulary';
import type { SentenceView } from '@/lib/services/house-style/describe-sentences';
import type { StyleView } from '@/lib/services/house-style/get-style';
import { leafAt } from '@/lib/services/house-style/leaves';

const PRINTS = ['newsroom', 'percent', 'numbers', 'margins', 'shelfLifeDays'].map((key) => `style.${key}`);
const WORDS = ['holds', 'fragile', 'does-not-hold', 'cannot-be-tested']
  .map((verdict) => `style.ladder.${verdict}`)
  .concat(LANGUAGES.flatMap((language) => [`style.banned.${language}`, `style.preferred.${language}`]));
const RULES = ['onePollHeadlines', 'twiceTheMargin', 'asPrintedNight'].map((key) => `style.${key}`);
const TESTS = [
  'level',
  ...['weighted', 'clustered', 'unweighted'].flatMap((design) => [
    `assumed.${design}.value`,
    `assumed.${design}.range`,
  ]),
  'kishRange',
  'indifferencePp',
  'minimumNEff',
].map((key) => `policy.${key}`);

/** A whole version, to be read. */
export function StyleReading({
  body,
  sentences,
}: {
  body: StyleView['body'];
  sentences: readonly SentenceView[];
}) {
  return (
    <>
      <Heading>How the desk prints</Heading>
      <Decisions body={body} paths={PRINTS} />
      <Heading>Words</Heading>
      <Decisions body={body} paths={WORDS} stacked />
      <Heading>Readings and rules</Heading>
      <Decisions body={body} paths={RULES} />
      <Heading>What the desk tests by</Heading>
      <Decisions body={body} paths={TESTS} />
      <Heading>Samples that are not random</Heading>
      <DefinitionList
        className="max-w-prose"
        items={NOT_RANDOM.map((kind) => ({
          key: kind,
          term: sampleName(kind),
          value: body.policy.comparisonBasis[kind]
            ? `Computed as if random, under ${body.style.comparisonRules[kind] || body.style.comparisonRule}`
            : 'No margin, no test',
        }))}
      />
      <Heading>Sentences</Heading>
      <Sentences sentences={sentences} />
    </>
  );
}

function Heading({ children }: { children: string }) {
  return (
    <div className="mt-8">
      <SectionHeading>{children}</SectionHeading>
    </div>
  );
}

function Decisions({ body, paths, stacked }: { body: unknown; paths: string[]; stacked?: boolean }) {
  return (
    <DefinitionList
      className="max-w-prose"
      stacked={stacked}
      items={paths.map((path) => ({
        key: path,
        term: decisionName(path),
        value: valueWords(path, leafAt(body, path)),
      }))}
    />
  );
}

function Sentences({ sentences }: { sentences: readonly SentenceView[] }) {
  const groups = [...new Set(sentences.map(({ language, part }) => `${language}.${part}`))];
  return (
    <>
      {groups.map((group) => {
        const [language = '', part = ''] = group.split('.');
        const own = sentences.filter((one) => one.language === language && one.part === part);
        return (
          <Details
            key={group}
            summary={`${LANGUAGE_NAMES[language] ?? language}: ${PART_NAMES[part] ?? part} (${own.length})`}
          >
            <dl>
              {own.map((one) => (
                <div key={one.path} className="border-b border-rule py-2">
                  <dt className="text-13 text-soft">
                    {one.claim ? `${CLAIM_NAMES[one.claim] ?? one.claim}: ` : ''}
                    {stateName(one.path.split('.').at(-1) ?? '')}
                  </dt>
                  <dd className="max-w-prose font-serif wrap-anywhere">{one.text}</dd>
                </div>
              ))}
            </dl>
          </Details>
        );
      })}
    </>
  );
}
