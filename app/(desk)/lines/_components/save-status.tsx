import type { Saving } from '@/components/forms/sheet/use-autosave';
import { Button } from '@/components/ui/button';
import { CautionNote } from '@/components/ui/caution-note';
import { formatTime } from '@/lib/format/date';

/** Whether what was typed is kept. A refusal leaves every word on the screen. */
export function SaveStatus({
  saving,
  zone,
  onRetry,
}: {
  saving: Saving;
  zone: string;
  onRetry: () => unknown;
}) {
  return (
    <div aria-live="polite" className="text-13 text-soft">
      {words(saving, zone)}
      {saving.kind === 'failed' ? (
        <CautionNote title="What you typed is not saved yet">
          <p>{saving.message} It stays on this page and in this browser.</p>
          <Button className="mt-2" onClick={() => onRetry()}>
            Save now
          </Button>
        </CautionNote>
      ) : null}
      {saving.kind === 'stopped' ? (
        <CautionNote title="What you typed is not saved">
          <p>{saving.message}</p>
          <p>
            Your words stay on this page; after the reload this browser offers to put them back over what is
            there then.
          </p>
          <Button className="mt-2" onClick={() => window.location.reload()}>
            Reload the page
          </Button>
        </CautionNote>
      ) : null}
    </div>
  );
}

function words(saving: Saving, zone: string): string {
  if (saving.kind === 'saving') return 'Saving…';
  if (saving.kind !== 'saved') return '';
  return saving.at === null
    ? 'Changes are saved as you type.'
    : `Saved ${formatTime(saving.at, zone, 'en-GB')}`;
}
