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
export const EN_AS_PRINTED: AsPrintedMessages = {
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
