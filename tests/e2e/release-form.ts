import type { Page } from '@playwright/test';

export type PressNote = {
  race: string | { name: string; options: string[] };
  pollster: string;
  sponsor: string;
  n: string;
  margin: string;
  interviews: [from: string, to: string];
  published: string;
  shares: [option: string, printed: string][];
  wording: string;
  embargo?: { local: string; zone: string };
};

/** The calendar day so many days from today, in UTC. */
export function dayFromToday(days: number): string {
  return new Date(Date.now() + days * 86_400_000).toISOString().slice(0, 10);
}

/** Types a press note into the form, as a reporter would, up to the button. */
export async function typeRelease(page: Page, note: PressNote): Promise<void> {
  await page.goto('/releases/new');
  const race = page.getByLabel('Race', { exact: true });
  if (typeof note.race === 'string') await race.selectOption({ label: note.race });
  else {
    await race.selectOption({ label: 'Add a race…' });
    await page.getByLabel('Name of the race').fill(note.race.name);
    await page.getByLabel('Kind').selectOption('candidate');
    await page.getByLabel('Answer options').fill(note.race.options.join('\n'));
    await page.getByLabel('Answer options').blur();
  }
  await page.getByLabel('Pollster', { exact: true }).fill(note.pollster);
  await page.getByLabel('Sponsor', { exact: true }).fill(note.sponsor);
  await page.getByLabel('Population', { exact: true }).selectOption('likely-voters');
  await page.getByLabel('Mode', { exact: true }).selectOption('live-telephone');
  await page.getByLabel('Sample source', { exact: true }).selectOption('probability');
  await page.getByLabel('Design', { exact: true }).selectOption('weighted');
  await page.getByLabel('First day of interviews').fill(note.interviews[0]);
  await page.getByLabel('Last day of interviews').fill(note.interviews[1]);
  await page.getByLabel('Publication date').fill(note.published);
  if (note.embargo) {
    await page.getByLabel('Under embargo').check();
    await page.getByLabel('Embargo ends').fill(note.embargo.local);
    await page.getByLabel('Time zone').fill(note.embargo.zone);
  }
  await page.getByLabel('Sample size', { exact: true }).fill(note.n);
  await page.getByLabel('Stated margin of error', { exact: true }).fill(note.margin);
  await page.getByLabel('Question wording', { exact: true }).fill(note.wording);
  for (const [index, [option, printed]] of note.shares.entries()) {
    const row = page.getByRole('group', { name: `Row ${index + 1}`, exact: true });
    if ((await row.count()) === 0) await page.getByRole('button', { name: 'Add an option' }).click();
    await row.getByLabel(`Option ${index + 1}`, { exact: true }).fill(option);
    await row.getByLabel('Share', { exact: true }).fill(printed);
  }
}
