/** Parts that several English messages share; each message is still one whole ICU sentence. */

export const POLL = 'this poll{populated, select, yes { of {population}} other {}} by {pollster}';
export const A_POLL = 'a poll{populated, select, yes { of {population}} other {}} by {pollster}';
export const TWO_POLLS = 'two polls{populated, select, yes { of {population}} other {}} by {pollsters}';
export const IN_THE_EARLIER =
  '{samePollster, select, yes {in its poll of {prevDates}} other {in the poll by {prevPollster} on {prevDates}}}';
export const ALLOWING =
  '{design, select, unweighted {rounding} clustered {rounding and clustering} other {rounding and weighting}}';
export const WEIGHTING = '{design, select, clustered {clustering} other {weighting}}';
export const TOWARDS = '{habit, select, US {toward} other {towards}}';

export const points = (name: string) => `{${name}Count, plural, one {point} other {points}}`;
export const percentagePoints = (name: string) =>
  `percentage {${name}Count, plural, one {point} other {points}}`;

/** What a margin is the margin of. */
export const QUANTITY =
  '{claim, select, lead {the gap between {a} and {b}} change {the change} leadChange {the change in the gap} netScore {the net score} netScoreChange {the change in the net score} gap {the gap between the two groups} other {the distance from {line}}}';
export const SHORT_QUANTITY =
  '{claim, select, lead {the gap} change {the change} leadChange {the change in the gap} netScore {the net score} netScoreChange {the change in the net score} gap {the gap between the groups} other {the distance from {line}}}';

/** Who or what could have produced a difference by chance, as the basis allows it to be said. */
export const chanceAlone = (could: string, sampleWord: string) =>
  `{basis, select, sampling {Sampling error alone ${could}} modelled {By the pollster’s own model, chance alone ${could}} other {Chance alone ${could} even ${sampleWord}}}`;
export const RANGE_RUNS = (samples: string) =>
  `{basis, select, sampling {Allowing for sampling error, the range runs} modelled {On the pollster’s own model, the range runs} other {If the ${samples} had been random, the range would run}} from`;
