/** Moves the focus to a part of the page, and opens what it is folded into. */
export function goTo(place: HTMLElement | null): void {
  if (!place) return;
  for (let fold = place.closest('details'); fold; fold = fold.parentElement?.closest('details') ?? null)
    fold.open = true;
  if (place.tabIndex < 0) place.tabIndex = -1;
  place.focus();
  place.scrollIntoView({ block: 'nearest' });
}
