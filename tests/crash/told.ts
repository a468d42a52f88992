export type Act = 'logged' | 'filed' | 'cleared' | 'embedded' | 'lifted' | 'pulled' | 'stored';
/** One act that the writer was told is done, as it prints it. */
export type Told = { act: Act; id: string };

/** Whole lines of what a killed process printed; one cut short was told to nobody. */
export function toldIn(printed: string): Told[] {
  return printed
    .split('\n')
    .slice(0, -1)
    .map((line) => JSON.parse(line) as Told);
}
