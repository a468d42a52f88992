import type { Browser, Page } from '@playwright/test';
import { serveArticle } from './article';
import { dayFromToday, typeRelease } from './release-form';
import { accountWith, expect, signIn, test } from './support';

const RACE = 'Harbour ward by-election';
const WORDING = 'If the by-election were held today, for whom would you vote?';
const OPTIONS = ['Alder', 'Brook', 'Someone else'];

// The pulled chart and the refused second reader answer with an error status on purpose.
test.use({ expectedErrors: [/status of (404|409|410)/] });

test('a release typed from a press note becomes a cleared sheet and a live chart, by three people', async ({
  browser,
}) => {
  test.setTimeout(240_000);
  const reporter = await desk(browser, 'reporter');
  const editor = await desk(browser, 'editor');
  const copyDesk = await desk(browser, 'copy-desk');

  await test.step('the reporter logs the earlier release', async () => {
    await typeRelease(reporter, {
      race: { name: RACE, options: OPTIONS },
      pollster: 'Kelmouth Research',
      sponsor: 'The Averil Courier',
      n: '1,005',
      margin: '3.8',
      interviews: [dayFromToday(-33), dayFromToday(-30)],
      published: dayFromToday(-29),
      wording: WORDING,
      shares: [
        ['Alder', '44'],
        ['Brook', '43'],
        ['Someone else', '4'],
        ['Don’t know', '9'],
      ],
    });
    await reporter.getByRole('button', { name: 'Log the release' }).click();
    await reporter.waitForURL(/\/releases\/[\w-]{22}$/);
  });

  await test.step('findings stand beside the form while the new one is typed, and survive a reload', async () => {
    await typeRelease(reporter, {
      race: RACE,
      pollster: 'Kelmouth Research',
      sponsor: 'The Averil Courier',
      n: '1,012',
      margin: '3.7',
      interviews: [dayFromToday(-5), dayFromToday(-2)],
      published: dayFromToday(-1),
      wording: WORDING,
      shares: [
        ['Alder', '47'],
        ['Brook', '41'],
        ['Someone else', '4'],
        ['Don’t know', '8'],
      ],
    });
    const live = reporter.getByLabel('Findings so far');
    await expect(live.getByRole('heading', { name: 'Alder minus Brook: +6' })).toBeVisible();
    await expect(live.getByText('Not shown').first()).toBeVisible();
    await expect(live.getByRole('heading', { name: /^Alder, .*: \+3$/ })).toBeVisible();
    await expect(reporter.getByText(/^Saved/).first()).toBeVisible();
    await reporter.reload();
    await expect(reporter.getByLabel('Sample size', { exact: true })).toHaveValue('1,012');
    await expect(reporter.getByRole('group', { name: 'Row 1', exact: true }).getByLabel('Share')).toHaveValue(
      '47',
    );
  });

  await test.step('the release shows the worked figures: 1.4426 (1.4039–1.4819), lead 6, z 1.6975', async () => {
    await reporter.getByRole('button', { name: 'Log the release' }).click();
    await reporter.waitForURL(/\/releases\/[\w-]{22}$/);
    await expect(reporter.getByRole('heading', { level: 1 })).toContainText('Alder 47, Brook 41');
    await expect(reporter.getByRole('heading', { name: 'Alder minus Brook: +6' })).toBeVisible();
    await reporter.getByText('Working', { exact: true }).first().click();
    const main = reporter.locator('main');
    await expect(main).toContainText('1.4426');
    await expect(main).toContainText('1.40388 to 1.48186');
    await expect(main).toContainText('1.6975');
  });

  await test.step('the reporter drafts, edits and files a sheet', async () => {
    await reporter
      .getByRole('link', { name: /Draft a sheet/ })
      .first()
      .click();
    await reporter.waitForURL(/\/lines\/new/);
    await reporter.getByRole('radio', { name: /Alder minus Brook: \+6/ }).check();
    await reporter.getByRole('button', { name: 'Draft the sheet' }).click();
    await reporter.waitForURL(/\/lines\/[\w-]{22}$/);
    const body = reporter.getByLabel('Body sentence', { exact: true });
    await body.fill(`${await body.inputValue()} Eight in a hundred had not decided.`);
    await reporter.getByRole('button', { name: 'File', exact: true }).click();
    await expect(reporter.getByText('You filed this; somebody else reads it.')).toBeVisible();
    await expect(reporter.getByRole('button', { name: 'Clear for publication' })).toHaveCount(0);
  });

  await test.step('the copy desk sees nothing of it yet', async () => {
    await copyDesk.goto(`/copy-desk?race=${encodeURIComponent(RACE)}`);
    await expect(copyDesk.getByText('No cleared sheet fits that search')).toBeVisible();
  });

  await test.step('the editor finds it in the queue and sends it back; the reporter files again', async () => {
    await editor.goto('/lines');
    await editor
      .getByRole('link', { name: /Alder.*Brook/ })
      .filter({ hasText: /47%/ })
      .first()
      .click();
    await editor.waitForURL(/\/lines\/[\w-]{22}$/);
    await expect(editor.getByText('Eight in a hundred had not decided.')).toBeVisible();
    await editor.getByRole('button', { name: 'Send back' }).click();
    const dialog = editor.getByRole('dialog');
    await dialog.getByLabel('What should change?').fill('Write the share of the undecided as 8%.');
    await dialog.getByRole('button', { name: 'Send back' }).click();
    await expect(editor.getByText('Sent back.')).toBeVisible();
    await reporter.reload();
    await expect(reporter.getByText('Write the share of the undecided as 8%.').first()).toBeVisible();
    const body = reporter.getByLabel('Body sentence', { exact: true });
    const text = await body.inputValue();
    await body.fill(text.replace('Eight in a hundred', '8%'));
    await reporter.getByRole('button', { name: 'File', exact: true }).click();
    await expect(reporter.getByText('You filed this; somebody else reads it.')).toBeVisible();
  });

  await test.step('the editor clears it', async () => {
    await editor.reload();
    await editor.getByRole('button', { name: 'Clear for publication' }).click();
    await expect(editor.getByText('Cleared for publication.').first()).toBeVisible();
  });

  const embedUrl = await test.step('the copy desk copies the caveat and makes the embed', async () => {
    await copyDesk.reload();
    await expect(copyDesk.getByText('8% had not decided.')).toBeVisible();
    await copyDesk.getByRole('button', { name: /Plain/ }).first().click();
    await expect(copyDesk.getByText(/^Copied/).first()).toBeVisible();
    const copied = await copyDesk.evaluate(() => navigator.clipboard.readText());
    expect(copied.length).toBeGreaterThan(20);
    await copyDesk.getByRole('button', { name: 'Make an embed' }).first().click();
    await expect(copyDesk.getByRole('link', { name: /embed/i }).first()).toBeVisible();
    await copyDesk.goto('/embeds');
    const frame = copyDesk.locator('iframe').first();
    return new URL((await frame.getAttribute('src'))!, copyDesk.url()).href;
  });

  await test.step('an article on another origin shows it, without JavaScript too', async () => {
    const article = await serveArticle(embedUrl);
    for (const javaScriptEnabled of [true, false]) {
      const context = await browser.newContext({ javaScriptEnabled });
      const page = await context.newPage();
      await page.goto(article.url);
      const chart = page.frameLocator('iframe');
      await expect(chart.getByRole('heading', { level: 1 })).toContainText('Alder');
      await expect(chart.getByText(/Kelmouth Research surveyed 1,012 likely voters/).last()).toBeVisible();
      await expect(chart.getByRole('table')).toContainText('Don’t know');
      await expect(chart.locator('svg').first()).toBeVisible();
      await context.close();
    }
    await article.close();
  });

  await test.step('the public address serves picture and data, and answers 304', async () => {
    const page = await copyDesk.request.get(embedUrl);
    expect(page.status()).toBe(200);
    const etag = page.headers().etag!;
    const again = await copyDesk.request.get(embedUrl, { headers: { 'If-None-Match': etag } });
    expect(again.status()).toBe(304);
    const picture = await copyDesk.request.get(`${embedUrl}/chart.svg`);
    expect(picture.headers()['content-type']).toContain('image/svg+xml');
    const data = (await (await copyDesk.request.get(`${embedUrl}/data.json`)).json()) as {
      finding: { verdict: string; estimatePp: number; z: number };
      base: { deff: number };
    };
    expect(data.finding.verdict).toBe('does-not-hold');
    expect(data.finding.estimatePp).toBe(6);
    expect(data.finding.z).toBeCloseTo(1.6975, 4);
    expect(data.base.deff).toBeCloseTo(1.4426, 4);
  });

  await test.step('a correction is staged, its replacement agreed to, and both change places at one address', async () => {
    await reporter.getByRole('link', { name: 'Open the release' }).click();
    await reporter.getByRole('link', { name: 'Correct', exact: true }).click();
    await reporter.getByLabel('Sample size', { exact: true }).fill('1,021');
    await reporter.getByRole('button', { name: 'See what this does' }).click();
    await expect(reporter.getByText('1 sheet pulled.')).toBeVisible();
    await expect(reporter.getByText('What differs: sample size.')).toBeVisible();
    await reporter.getByRole('radio', { name: /The pollster’s/ }).check();
    await reporter
      .getByLabel('What was wrong, in a sentence')
      .fill('The pollster miscounted its interviews.');
    await reporter.getByRole('button', { name: /Stage it/ }).click();
    await reporter.waitForURL(/\/releases\/corrections\/[\w-]{22}$/);
    const correctionUrl = reporter.url();
    expect((await copyDesk.request.get(embedUrl)).status()).toBe(200);
    await reporter.getByRole('button', { name: 'Draft its replacement' }).click();
    await reporter.waitForURL(/\/lines\/[\w-]{22}$/);
    await reporter.getByRole('button', { name: 'File', exact: true }).click();
    await expect(reporter.getByText('You filed this; somebody else reads it.')).toBeVisible();
    await editor.goto(reporter.url());
    await editor.getByRole('button', { name: 'Clear for publication' }).click();
    await expect(editor.getByText(/^Agreed to\./)).toBeVisible();
    await reporter.goto(correctionUrl);
    await reporter.getByRole('button', { name: /^Apply/ }).click();
    await expect(reporter.getByText('Applied.')).toBeVisible();
    const data = await copyDesk.request.get(`${embedUrl}/data.json`);
    expect(await data.json()).toMatchObject({ n: 1021, version: 2 });
    const old = await copyDesk.request.get(`${embedUrl}@1`);
    expect(old.status()).toBe(410);
    expect(await old.text()).toContain('1,012');
    await copyDesk.goto('/copy-desk');
    await expect(copyDesk.getByText('Its replacement is cleared.')).toBeVisible();
    await reporter.getByRole('link', { name: 'Versions' }).click();
    await expect(reporter.getByRole('columnheader', { name: 'Version 2, current' })).toBeVisible();
    await expect(reporter.getByRole('row', { name: /^Interviews 1,021/ })).toContainText('1,012');
  });

  await test.step('the editor pulls it: the address answers 410 without a figure', async () => {
    await editor.reload();
    await editor.getByRole('button', { name: 'Pull', exact: true }).click();
    const dialog = editor.getByRole('dialog');
    await dialog.getByRole('textbox').fill('The pollster withdrew the release this afternoon.');
    await dialog.getByRole('button', { name: 'Pull', exact: true }).click();
    await expect(editor.getByText(/Pulled/).first()).toBeVisible();
    const gone = await copyDesk.request.get(embedUrl);
    expect(gone.status()).toBe(410);
    // The page tells when it was withdrawn, in figures of its own.
    const words = (await gone.text()).replace(/<time.*?<\/time>/g, '');
    expect(words).not.toMatch(/47|41\s*%|\+6/);
    await copyDesk.goto(`/copy-desk?race=${encodeURIComponent(RACE)}`);
    await expect(copyDesk.getByText('No cleared sheet fits that search')).toBeVisible();
  });

  await test.step('the history tells all of it', async () => {
    await editor.goto('/history');
    for (const action of [
      'corrected release',
      'pulled sheet',
      'made embed',
      'copied',
      'cleared sheet',
      'sent sheet back',
    ])
      await expect(editor.getByText(action, { exact: false }).first()).toBeVisible();
  });
});

async function desk(browser: Browser, role: string): Promise<Page> {
  const context = await browser.newContext({ permissions: ['clipboard-read', 'clipboard-write'] });
  const page = await context.newPage();
  await signIn(page, accountWith(role));
  return page;
}
