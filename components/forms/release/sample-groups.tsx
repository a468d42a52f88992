'use client';

import { useWatch } from 'react-hook-form';
import {
  DEFF_SOURCE_NAMES,
  DEFF_SOURCES,
  DESIGN_NAMES,
  DESIGNS,
  MODE_NAMES,
  MODES,
  POPULATION_NAMES,
  POPULATIONS,
  SAMPLE_SOURCE_NAMES,
  SAMPLE_SOURCES,
} from '@/lib/domain/vocabulary';
import { choicesOf } from './choices-of';
import { ChoiceField, Group, type InForm, Row, TextField, Withholdable, WithheldChoice } from './fields';
import { Interval } from './interval';

/** Who did the fieldwork and who paid for it. */
export function PollsterGroup({
  form,
  pollsters,
  sponsors,
}: InForm & { pollsters: readonly string[]; sponsors: readonly string[] }) {
  return (
    <Group title="Pollster and sponsor">
      <Row>
        <TextField form={form} path="pollster" label="Pollster" list="known-pollsters" maxLength={120} />
        <Withholdable form={form} name="sponsor" what="sponsor">
          {(isWithheld) => (
            <TextField
              form={form}
              path="sponsor.value"
              label="Sponsor"
              list="known-sponsors"
              maxLength={120}
              readOnly={isWithheld}
            />
          )}
        </Withholdable>
      </Row>
      <Names id="known-pollsters" names={pollsters} />
      <Names id="known-sponsors" names={sponsors} />
    </Group>
  );
}

function Names({ id, names }: { id: string; names: readonly string[] }) {
  return (
    <datalist id={id}>
      {names.map((name) => (
        <option key={name} value={name} />
      ))}
    </datalist>
  );
}

/** Who was asked, and how. */
export function SampleGroup({ form }: InForm) {
  return (
    <Group title="Who was asked, and how">
      <Row>
        <WithheldChoice
          form={form}
          name="population"
          what="population"
          label="Population"
          choices={choicesOf(POPULATIONS, POPULATION_NAMES)}
        />
        <WithheldChoice
          form={form}
          name="mode"
          what="mode"
          label="Mode"
          choices={choicesOf(MODES, MODE_NAMES)}
        />
        <ChoiceField
          form={form}
          path="sampleSource"
          label="Sample source"
          hint="Only a random one has a margin."
          empty="Choose"
          choices={choicesOf(SAMPLE_SOURCES, SAMPLE_SOURCE_NAMES)}
        />
        <ChoiceField
          form={form}
          path="design"
          label="Design"
          hint="“Not known” is counted as weighted."
          empty="Choose"
          choices={choicesOf(DESIGNS, DESIGN_NAMES)}
        />
      </Row>
    </Group>
  );
}

/** How many, and how much they are worth. */
export function SizeGroup({ form }: InForm) {
  const source = useWatch({ control: form.control, name: 'deff.source' });
  const sampleSource = useWatch({ control: form.control, name: 'sampleSource' });
  const isModelled = sampleSource !== '' && sampleSource !== 'probability';
  return (
    <Group title="Size and margin">
      <Row>
        <Withholdable form={form} name="n" what="sample size">
          {(isWithheld) => (
            <TextField
              form={form}
              path="n.value"
              label="Sample size"
              numeric
              inputMode="numeric"
              suffix="people"
              readOnly={isWithheld}
              maxLength={20}
            />
          )}
        </Withholdable>
        <ChoiceField
          form={form}
          path="deff.source"
          label="Design effect"
          empty="Not given"
          choices={choicesOf(DEFF_SOURCES, DEFF_SOURCE_NAMES)}
        />
      </Row>
      {source === '' ? null : (
        <Row>
          <TextField form={form} path="deff.value" label="Its value" numeric maxLength={20} />
          {source === 'design' ? (
            <TextField
              form={form}
              path="deff.df"
              label="Degrees of freedom"
              optional
              numeric
              inputMode="numeric"
              maxLength={20}
            />
          ) : null}
        </Row>
      )}
      <Withholdable form={form} name="statedMargin" what="margin of error">
        {(isWithheld) => (
          <Interval form={form} name="statedMargin" label="Stated margin of error" isReadOnly={isWithheld} />
        )}
      </Withholdable>
      {isModelled ? (
        <Interval form={form} name="modelledInterval" label="Modelled interval" isReadOnly={false} />
      ) : null}
    </Group>
  );
}
