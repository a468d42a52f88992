import { useState } from 'react';
import { LINE_STATE_NAMES } from '@/lib/domain/sheet';
import type { OpenSheetItem } from '@/lib/services/sheet/list-open-sheets';

/** What changed in the queue since it was last read, in words for a live region; empty at first. */
export function useNews(sheets: readonly OpenSheetItem[] | undefined): string {
  const [seen, setSeen] = useState(sheets);
  const [news, setNews] = useState('');
  if (sheets && sheets !== seen) {
    const said = seen ? newsBetween(seen, sheets) : '';
    if (said !== '') setNews(said);
    setSeen(sheets);
  }
  return news;
}

export function newsBetween(before: readonly OpenSheetItem[], after: readonly OpenSheetItem[]): string {
  const known = new Map(before.map((sheet) => [sheet.id, sheet]));
  const changed = after.flatMap((sheet) => {
    const was = known.get(sheet.id);
    if (was && was.state === sheet.state && was.waitsFor === sheet.waitsFor) return [];
    const state = LINE_STATE_NAMES[sheet.state].toLowerCase();
    const forYou = sheet.waitsFor === 'me' ? ', waiting for you' : '';
    return [`${sheet.race}, ${sheet.pollster}: ${state}${forYou}.`];
  });
  const left = before.filter((sheet) => !after.some(({ id }) => id === sheet.id)).length;
  const gone =
    left === 0 ? [] : [left === 1 ? 'One sheet left the queue.' : `${left} sheets left the queue.`];
  return [...changed, ...gone].join(' ');
}
