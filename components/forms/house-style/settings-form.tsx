'use client';

import { useState } from 'react';
import { NOT_RANDOM } from '@/lib/domain/house-style';
import { SectionHeading } from '../../ui/section-heading';
import {
  ChoiceSetting,
  ListSetting,
  NumberSetting,
  RangeSetting,
  type SettingProps,
  TextSetting,
  YesNoSetting,
} from './setting-field';

export type PropsOf = (path: string) => SettingProps;

const DESIGNS = ['weighted', 'clustered', 'unweighted'];
const VERDICTS = ['holds', 'fragile', 'does-not-hold', 'cannot-be-tested'];

/** Everything of a house style that is no sentence: how the desk prints, what it tests by, which words it uses. */
export function SettingsForm({ propsOf, languages }: { propsOf: PropsOf; languages: readonly string[] }) {
  return (
    <>
      <section className="mt-8" aria-labelledby="style-prints">
        <SectionHeading id="style-prints">How the desk prints</SectionHeading>
        <TextSetting {...propsOf('style.newsroom')} hint="As it stands within a sentence." />
        <ChoiceSetting {...propsOf('style.percent')} offered={['sign', 'word', 'per-cent']} />
        <ChoiceSetting {...propsOf('style.numbers')} offered={['figures', 'words-to-nine']} />
        <ChoiceSetting {...propsOf('style.margins')} offered={['whole', 'half', 'tenth']} />
        {languages.map((language) => (
          <TextSetting
            key={language}
            {...propsOf(`style.locales.${language}`)}
            hint="Language and country, such as en-GB or en-US: it decides dates and separators."
          />
        ))}
      </section>
      <section className="mt-8" aria-labelledby="style-words">
        <SectionHeading id="style-words">Words</SectionHeading>
        {VERDICTS.map((verdict) => (
          <Lines
            key={verdict}
            {...propsOf(`style.ladder.${verdict}`)}
            hint="One a line, strongest first. Headlines and titles of this verdict use one of them."
          />
        ))}
        {languages.map((language) => (
          <div key={language}>
            <Lines
              {...propsOf(`style.banned.${language}`)}
              hint="One a line. No sentence of this desk uses them, and the wording check marks them."
            />
            <Preferred {...propsOf(`style.preferred.${language}`)} />
          </div>
        ))}
      </section>
      <section className="mt-8" aria-labelledby="style-rules">
        <SectionHeading id="style-rules">Readings and rules</SectionHeading>
        <ChoiceSetting
          {...propsOf('style.onePollHeadlines')}
          offered={['allow', 'warn', 'refuse']}
          hint="Of claims that compare no two polls. Warn marks the headline while it is written; refuse drafts the sheet without one and files none."
        />
        <YesNoSetting
          {...propsOf('style.twiceTheMargin')}
          hint="Whether a lead is more than twice the margin, shown beside the verdict. It never exceeds it."
        />
        <NumberSetting
          {...propsOf('style.shelfLifeDays')}
          mayBeEmpty
          suffix="days"
          hint="Counted from the last field day. Empty: no set time."
        />
        <YesNoSetting
          {...propsOf('style.asPrintedNight')}
          hint="Unedited text of printed figures, no comparison and no verdict word, marked “one reader” until a second person has read it."
        />
      </section>
      <section className="mt-8" aria-labelledby="style-tests">
        <SectionHeading id="style-tests">What the desk tests by</SectionHeading>
        <NumberSetting {...propsOf('policy.level')} factor={100} suffix="%" />
        {DESIGNS.map((design) => (
          <div key={design} className="flex flex-wrap gap-x-6">
            <NumberSetting {...propsOf(`policy.assumed.${design}.value`)} />
            <RangeSetting {...propsOf(`policy.assumed.${design}.range`)} />
          </div>
        ))}
        <RangeSetting {...propsOf('policy.kishRange')} />
        <NumberSetting {...propsOf('policy.indifferencePp')} suffix="points" />
        <NumberSetting {...propsOf('policy.minimumNEff')} suffix="interviews" />
      </section>
      <section className="mt-8" aria-labelledby="style-basis">
        <SectionHeading id="style-basis">Samples that are not random</SectionHeading>
        <p className="mb-3 max-w-prose text-soft">
          They have no margin of sampling error. Where a rule of law or of the house asks for a comparison all
          the same, it is computed as if the sample had been random, named in print, and never better than
          fragile.
        </p>
        <TextSetting
          {...propsOf('style.comparisonRule')}
          hint="Named beside the margin where no other rule is."
        />
        {NOT_RANDOM.map((kind) => (
          <div key={kind}>
            <YesNoSetting {...propsOf(`policy.comparisonBasis.${kind}`)} />
            <TextSetting {...propsOf(`style.comparisonRules.${kind}`)} hint="Empty: the rule above." />
          </div>
        ))}
      </section>
    </>
  );
}

function Lines(props: SettingProps) {
  const [text, setText] = useState(() => (Array.isArray(props.value) ? props.value.join('\n') : ''));
  return <ListSetting {...props} text={text} onText={setText} />;
}

function Preferred(props: SettingProps) {
  const [text, setText] = useState(() =>
    (Array.isArray(props.value) ? props.value : [])
      .map((one: { say: string; insteadOf: string }) => `${one.say} = ${one.insteadOf}`)
      .join('\n'),
  );
  const read = (line: string) => {
    const [say = '', insteadOf = ''] = line.split('=').map((side) => side.trim());
    return { say, insteadOf };
  };
  return (
    <ListSetting
      {...props}
      text={text}
      onText={setText}
      read={read}
      hint="One a line: what this desk says, an equals sign, what it is said instead of. Such as: poll = survey."
    />
  );
}
