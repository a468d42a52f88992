'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { Rail, type RailItem } from '@/components/ui/rail';
import { sectionOf } from './sections';
import { SignOut } from './sign-out';

/** The rail of whoever is signed in, with its weight at the section one is in. */
export function DeskRail({
  items,
  name,
  roles,
}: {
  items: readonly RailItem[];
  name: string;
  roles: string;
}) {
  const hrefs = items.map((item) => item.href);
  return (
    <Rail
      items={items}
      currentHref={sectionOf(usePathname(), hrefs)}
      foot={
        <>
          <p className="text-15 font-semibold text-ink">{name}</p>
          <p>{roles}</p>
          <p className="mt-2">
            <Link href="/account" className="inline-block py-1">
              Your account
            </Link>
          </p>
          <SignOut />
        </>
      }
    />
  );
}
