/** What fills each slot, in the words of the list that it is inserted from. */
const SLOTS: Record<string, string> = {
  a: 'the one with the higher figure',
  b: 'the other one',
  option: 'the answer or name',
  aShare: 'share of the higher one',
  bShare: 'share of the other one',
  gap: 'size of the gap in points',
  gapCount: 'one point or several (gap)',
  now: 'share in this poll',
  then: 'share in the earlier poll',
  aNow: 'higher one’s share now',
  bNow: 'other one’s share now',
  aThen: 'higher one’s share then',
  bThen: 'other one’s share then',
  move: 'size of the change in points',
  moveCount: 'one point or several (change)',
  toward: 'whom the gap moves towards',
  away: 'whom it moves away from',
  direction: 'up or down',
  side: 'above or below the line',
  share: 'the share',
  line: 'the threshold in words',
  asked: 'share of everyone asked',
  pollster: 'pollster, within a sentence',
  pollsterStart: 'pollster, starting a sentence',
  pollsters: 'both pollsters',
  newsroom: 'our newsroom, within a sentence',
  newsroomStart: 'our newsroom, starting a sentence',
  sponsor: 'who paid for it',
  sponsored: 'whether the sponsor is known',
  population: 'who was asked',
  populated: 'whether it is known who was asked',
  n: 'how many were asked',
  sized: 'whether it is known how many',
  mode: 'how they were asked',
  modeKnown: 'whether it is known how',
  dates: 'field dates',
  start: 'first field day',
  end: 'last field day',
  dateSpan: 'one day, one month or wider',
  prevDates: 'earlier field dates',
  prevStart: 'first earlier field day',
  prevEnd: 'last earlier field day',
  prevPollster: 'pollster of the earlier poll',
  prevPopulation: 'who was asked then',
  prevN: 'how many were asked then',
  samePollster: 'same pollster or another',
  setting: 'contest or question',
  known: 'which figures are disclosed',
  reason: 'why it cannot be tested',
  basis: 'random, modelled or as if random',
  design: 'weighted or clustered',
  low: 'low end of the range',
  high: 'high end of the range',
  span: 'range across zero or not',
  margin: 'our margin',
  marginCount: 'one point or several (margin)',
  widerMargin: 'margin at the heavy end',
  stated: 'whether a margin is stated',
  statedPp: 'the stated margin',
  level: 'confidence level',
  race: 'the race',
  detectable: 'change that would have been found',
  indifference: 'margin of indifference',
  comparisonRule: 'rule named where as if random',
  sample: 'kind of sample',
  title: 'the chart’s title',
  items: 'the list of items',
  url: 'address of the source',
  question: 'the question asked',
};

export function slotWords(name: string): string {
  return (
    SLOTS[name] ?? (name.endsWith('Count') ? 'one or several' : name.replace(/([A-Z])/g, ' $1').toLowerCase())
  );
}

/** What is put at the cursor: the slot itself, or the frame of a choice with its cases. */
export function slotText({ name, choices }: { name: string; choices: readonly string[] }): string {
  if (choices.length === 0) return `{${name}}`;
  const kind = name.endsWith('Count') || name === 'count' ? 'plural' : 'select';
  const cases = choices.includes('other') ? choices : [...choices, 'other'];
  return `{${name}, ${kind}, ${cases.map((choice) => `${choice} {}`).join(' ')}}`;
}
