'use client';

import { Checkbox } from '../../ui/checkbox';
import { fieldId } from './field-path';
import { AreaField, Group, type InForm, TextField, Withholdable } from './fields';

/** What was asked. */
export function QuestionGroup({ form }: InForm) {
  return (
    <Group title="Question">
      <Withholdable form={form} name="wording" what="question wording">
        {(isWithheld) => (
          <AreaField
            form={form}
            path="wording.value"
            label="Question wording"
            hint="Word for word; case and punctuation do not count when releases are compared."
            readOnly={isWithheld}
            maxLength={2000}
          />
        )}
      </Withholdable>
      <Checkbox
        {...form.register('sameQuestion')}
        id={fieldId('sameQuestion')}
        label="Same question as this pollster’s earlier releases"
        hint="Tick it where the wording is not given but is known to be the same. The editor who clears sees the tick."
      />
    </Group>
  );
}

/** Where all this was read. */
export function SourceGroup({ form }: InForm) {
  return (
    <Group title="Source and method">
      <Withholdable form={form} name="sourceUrl" what="source link">
        {(isWithheld) => (
          <TextField
            form={form}
            path="sourceUrl.value"
            label="Source link"
            type="url"
            inputMode="url"
            placeholder="https://"
            readOnly={isWithheld}
            maxLength={2000}
          />
        )}
      </Withholdable>
      <AreaField
        form={form}
        path="methodNote"
        label="Method note"
        hint="The pollster’s own words on method, for the desk. Markdown works; pictures and scripts are taken out."
        optional
        rows={4}
        maxLength={20000}
      />
    </Group>
  );
}
