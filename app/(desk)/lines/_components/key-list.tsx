'use client';

import { useEffect, useState } from 'react';
import { goTo } from '@/components/lines/go-to';
import { Button } from '@/components/ui/button';
import { DefinitionList } from '@/components/ui/definition-list';
import { Dialog } from '@/components/ui/dialog';

/**
 * Each key goes to a place and presses nothing, so that no slip of the hand clears a sheet. Alt and Shift together
 * with a letter are free of the keys that screen readers take for themselves.
 */
const KEYS = [
  { letter: 'W', place: 'The words', find: ['[id^="line-"]'] },
  { letter: 'E', place: 'The evidence', find: ['#evidence'] },
  {
    letter: 'N',
    place: 'The next step: clear, send back, file',
    find: ['.next-bar-actions .button-primary', '.next-bar-actions button'],
  },
  { letter: 'M', place: 'Comments', find: ['#comments'] },
  { letter: 'D', place: 'What was done', find: ['#acts'] },
] as const;
const OFF = 'leadline-question-mark-off';

/** The keys of this page: `?` opens the list, and can be switched off in it. */
export function KeyList() {
  const [isOpen, setOpen] = useState(false);
  const [isOff, setOff] = useState(false);

  useEffect(() => {
    const press = (event: KeyboardEvent) => {
      if (event.ctrlKey || event.metaKey || event.defaultPrevented) return;
      if (event.key === '?' && !event.altKey && !isTyping(event.target) && !isSwitchedOff()) {
        event.preventDefault();
        setOff(false);
        setOpen(true);
        return;
      }
      const key =
        event.altKey && event.shiftKey ? KEYS.find(({ letter }) => event.code === `Key${letter}`) : undefined;
      if (!key || document.querySelector('dialog[open]')) return;
      event.preventDefault();
      goToFirst(key.find);
    };
    window.addEventListener('keydown', press);
    return () => window.removeEventListener('keydown', press);
  }, []);

  const open = () => {
    setOff(isSwitchedOff());
    setOpen(true);
  };
  const toggle = () => {
    keepSwitch(!isOff);
    setOff(!isOff);
  };
  return (
    <div className="no-print">
      <button
        type="button"
        className="text-13 font-semibold text-soft underline decoration-rule"
        onClick={open}
      >
        Keys<span className="sr-only"> of this page</span>
      </button>
      <Dialog isOpen={isOpen} onClose={() => setOpen(false)} title="Keys of this page">
        <DefinitionList
          items={[
            { term: 'This list', value: <kbd>?</kbd> },
            ...KEYS.map(({ letter, place }) => ({ term: place, value: <kbd>Alt + Shift + {letter}</kbd> })),
          ]}
        />
        <p className="my-3 text-13 text-soft">
          A key goes to its place and presses nothing. Enter or the space bar presses what has the focus.
        </p>
        <Button aria-pressed={isOff} onClick={toggle}>
          {isOff ? 'Let ? open this list' : 'Switch the key ? off'}
        </Button>
      </Dialog>
    </div>
  );
}

/** To the first of these that is on the page. */
function goToFirst(find: readonly string[]): void {
  const places = find.map((selector) => document.querySelector<HTMLElement>(selector));
  goTo(places.find((one) => one !== null) ?? null);
}

function isTyping(target: EventTarget | null): boolean {
  return target instanceof HTMLElement && target.matches('input, textarea, select, [contenteditable="true"]');
}

function isSwitchedOff(): boolean {
  try {
    return localStorage.getItem(OFF) === 'yes';
  } catch {
    return false;
  }
}

function keepSwitch(isOff: boolean): void {
  try {
    if (isOff) localStorage.setItem(OFF, 'yes');
    else localStorage.removeItem(OFF);
  } catch {
    // Without a store the key stays as it is.
  }
}
