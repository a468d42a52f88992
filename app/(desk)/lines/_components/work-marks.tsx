import { formatInstant, formatTime } from '@/lib/format/date';
import { spanInWords } from '@/lib/domain/wanted';
import type { OpenSheetItem } from '@/lib/services/sheet/list-open-sheets';

const LOCALE = 'en-GB';

/** When a sheet is wanted and what presses, under its place in the queue. */
export function WorkMarks({ sheet, now }: { sheet: OpenSheetItem; now: number }) {
  const marks = marksOf(sheet, now);
  if (marks.length === 0) return null;
  return (
    <ul className="mt-0.5 flex flex-wrap gap-x-5">
      {marks.map(({ text, presses }) => (
        <li key={text} className={presses ? 'font-semibold text-caution' : 'text-soft'}>
          {text}
        </li>
      ))}
    </ul>
  );
}

type Mark = { text: string; presses: boolean };

function marksOf({ wanted, look, isHeld, needsReview, isAsPrinted }: OpenSheetItem, now: number): Mark[] {
  const marks: (Mark | null)[] = [
    wanted && { text: wantedWords(wanted, now), presses: wanted.at <= now },
    look?.kind === 'escalated'
      ? { text: 'Not opened by a second person for 10 minutes', presses: true }
      : null,
    look?.kind === 'looked-at' ? { text: 'Opened by a second person', presses: false } : null,
    isHeld ? { text: 'Held: publication is barred now', presses: true } : null,
    needsReview ? { text: 'Needs review: changed in another language', presses: true } : null,
    isAsPrinted ? { text: 'Figures as printed', presses: false } : null,
  ];
  return marks.filter((mark) => mark !== null);
}

/** "Wanted by 11:30 in Europe/Vienna, in 25 minutes"; the day too where it is not the present one there. */
export function wantedWords({ at, zone }: { at: number; zone: string }, now: number): string {
  const [then, today] = [at, now].map((instant) => formatInstant(instant, zone, LOCALE));
  const isToday = then?.split(',')[0] === today?.split(',')[0];
  const time = isToday ? formatTime(at, zone, LOCALE) : then;
  const span = spanInWords(at, now);
  return at <= now ? `Overdue: wanted by ${time} (${zone}), ${span}` : `Wanted by ${time} (${zone}), ${span}`;
}
