/** The months of two releases for a heading, such as "August to September"; their days where the month is one. */
export function betweenReleases(earlierOn: string, laterOn: string, locale = 'en-GB'): string {
  const [earlier, later] = [earlierOn, laterOn].map((day) => new Date(`${day}T00:00:00Z`));
  if (!earlier || !later || Number.isNaN(earlier.getTime()) || Number.isNaN(later.getTime())) {
    return 'earlier to this';
  }
  const sameYear = earlierOn.slice(0, 4) === laterOn.slice(0, 4);
  const sameMonth = earlierOn.slice(0, 7) === laterOn.slice(0, 7);
  const format = new Intl.DateTimeFormat(locale, {
    month: 'long',
    ...(sameMonth ? { day: 'numeric' as const } : {}),
    ...(sameYear ? {} : { year: 'numeric' as const }),
    timeZone: 'UTC',
  });
  return `${format.format(earlier)} to ${format.format(later)}`;
}
