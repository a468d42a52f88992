/** One poll of a series: its day, what it measured, and the variance of its sampling error. */
export type LevelPoll = { readonly day: number; readonly value: number; readonly variance: number };

/** A poll that also says whose it is. */
export type HousePoll = LevelPoll & { readonly house: string };

/** A certified result: the level itself, with no house effect; variance 0 if it is exact. */
export type CertifiedResult = LevelPoll;

/** Two days whose levels are compared: the change is the later named one minus the first named one. */
export type LevelSpan = { readonly from: number; readonly to: number };
export type LevelChange = LevelSpan & { readonly change: number; readonly standardError: number };

/** Where a further poll would stand: the level of a day, with the effect of its house where houses are known. */
export type PollPlace = { readonly day: number; readonly house?: string };
export type PlacePrediction = PollPlace & { readonly mean: number; readonly variance: number };

export type HouseEffect = { readonly house: string; readonly effect: number; readonly standardError: number };

/** The days that a level is wanted for, and what else is asked of it. */
export type LevelDays = {
  readonly firstDay: number;
  readonly lastDay: number;
  readonly changes?: readonly LevelSpan[];
  readonly predictions?: readonly PollPlace[];
};

/** Which houses there are, and what their effects are measured from. */
export type HouseChoice = {
  readonly houses?: readonly string[];
  readonly reference?: readonly string[];
  readonly results?: readonly CertifiedResult[];
};
