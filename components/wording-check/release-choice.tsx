import { useState } from 'react';
import { formatDayRange } from '@/lib/format/date';
import { Checkbox } from '../ui/checkbox';
import { TextInput } from '../ui/text-input';

export type OfferedRelease = {
  id: string;
  race: string;
  pollster: string;
  fieldStartOn: string;
  fieldEndOn: string;
  n: number | null;
  isUnderEmbargo: boolean;
};

const MANY = 8;

/** One or several releases to check against; those chosen stay in sight whatever is searched for. */
export function ReleaseChoice({
  releases,
  chosen,
  max,
  onChange,
}: {
  releases: readonly OfferedRelease[];
  chosen: readonly string[];
  max: number;
  onChange: (chosen: string[]) => void;
}) {
  const [search, setSearch] = useState('');
  const words = search.trim().toLowerCase();
  const shown = releases.filter(
    ({ id, race, pollster }) => chosen.includes(id) || `${race} ${pollster}`.toLowerCase().includes(words),
  );
  const isFull = chosen.length >= max;
  return (
    <fieldset className="no-print">
      <legend className="field-label">Releases it is about</legend>
      <p className="field-hint">
        None, one, or up to {max}. Without one, only what needs no figures is judged.
      </p>
      {releases.length === 0 ? (
        <p className="py-2">There is no release that you may see.</p>
      ) : (
        <>
          {releases.length > MANY ? (
            <TextInput
              id="release-search"
              label="Find by race or pollster"
              value={search}
              maxLength={120}
              onChange={(event) => setSearch(event.target.value)}
            />
          ) : null}
          <div
            className="max-h-80 overflow-y-auto border-y border-rule py-2"
            role="group"
            aria-label="Releases"
            tabIndex={0}
          >
            {shown.map((release) => {
              const isChosen = chosen.includes(release.id);
              return (
                <Checkbox
                  key={release.id}
                  id={`release-${release.id}`}
                  className="mb-1!"
                  checked={isChosen}
                  disabled={!isChosen && isFull}
                  label={<ReleaseName release={release} />}
                  onChange={() =>
                    onChange(isChosen ? chosen.filter((id) => id !== release.id) : [...chosen, release.id])
                  }
                />
              );
            })}
            {shown.length === 0 ? <p className="text-soft">No release has such a race or pollster.</p> : null}
          </div>
        </>
      )}
    </fieldset>
  );
}

function ReleaseName({ release }: { release: OfferedRelease }) {
  return (
    <>
      {release.race}, {nameOf(release)}
      {release.isUnderEmbargo ? <strong className="text-caution"> Under embargo</strong> : null}
    </>
  );
}

/** "Kelmouth Research, 10–13 September 2026" */
export function nameOf({
  pollster,
  fieldStartOn,
  fieldEndOn,
}: Pick<OfferedRelease, 'pollster' | 'fieldStartOn' | 'fieldEndOn'>): string {
  return `${pollster}, ${formatDayRange(fieldStartOn, fieldEndOn, 'en-GB', { withYear: true })}`;
}
