type Done = { act: string; person: string };

/** Whether the act at this place is that of somebody who took back what they had filed, and no reader's refusal. */
export function isTakenBack(acts: readonly Done[], index = acts.length - 1): boolean {
  const act = acts[index];
  if (act?.act !== 'sent-back') return false;
  return acts.slice(0, index).findLast((earlier) => earlier.act === 'filed')?.person === act.person;
}
