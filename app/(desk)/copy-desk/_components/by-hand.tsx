'use client';

import { useEffect, useRef } from 'react';
import { TextArea } from '@/components/ui/text-area';

/** The fetched words, selected, where the page itself may not copy. */
export function ByHand({ id, text }: { id: string; text: string }) {
  const holder = useRef<HTMLDivElement>(null);
  useEffect(() => {
    const area = holder.current?.querySelector('textarea');
    area?.focus();
    area?.select();
  }, [text]);
  return (
    <div ref={holder}>
      <TextArea id={`by-hand-${id}`} label="Copy from here" copy readOnly rows={5} value={text} />
    </div>
  );
}
