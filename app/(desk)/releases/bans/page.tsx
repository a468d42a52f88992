import type { Metadata } from 'next';
import { CautionNote } from '@/components/ui/caution-note';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { readEnv } from '@/lib/env';
import { canActAsEditor } from '@/lib/domain/roles';
import { listBanRaces, listBans } from '@/lib/services/bans/bans';
import { BanEntry } from './_components/ban-entry';
import { EnterBan } from './_components/enter-ban';
import { endBanAction, enterBanAction } from './actions';

export const metadata: Metadata = { title: 'Publication bans' };

export default async function BansPage() {
  const { bans, races, mayChange } = await deskPage((actor, ctx) => ({
    bans: listBans(actor, ctx),
    races: listBanRaces(actor, ctx),
    mayChange: canActAsEditor(actor),
  }));
  const zone = readEnv().LEADLINE_ZONE;
  const groups = [
    { title: 'In force', of: bans.filter(({ state }) => state === 'in-force') },
    { title: 'Ahead', of: bans.filter(({ state }) => state === 'ahead') },
    { title: 'Over', of: bans.filter(({ state }) => state === 'over') },
  ];
  return (
    <>
      <PageTitle
        title="Publication bans"
        crumbs={[{ label: 'Releases', href: '/releases' }]}
        sub="Times in which a place bars poll figures. While one is in force, its sheets are not cleared or copied and its charts show nothing new."
      />
      <CautionNote title="Ask the lawyers">
        <p>
          Leadline knows no law. What stands here is what this newsroom entered; its lawyers and the election
          authority of the place decide.
        </p>
      </CautionNote>
      {bans.length === 0 ? <p className="mt-5">No ban was ever entered.</p> : null}
      {groups
        .filter(({ of }) => of.length > 0)
        .map(({ title, of }) => (
          <section key={title} aria-label={title} className="mt-6">
            <h2 className="section-heading">
              {title} ({of.length})
            </h2>
            <ul className="border-t-[1.5px] border-ink">
              {of.map((ban) => (
                <BanEntry key={ban.id} ban={ban} zone={zone} end={mayChange ? endBanAction : null} />
              ))}
            </ul>
          </section>
        ))}
      {mayChange ? <EnterBan races={races} zone={zone} enter={enterBanAction} /> : null}
    </>
  );
}
