/** Lower and upper end, in the unit of what they surround. */
export type Interval = readonly [low: number, high: number];
