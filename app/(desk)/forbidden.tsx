import { requireUser } from '@/lib/auth/actor';
import { NoPermission } from './_components/no-permission';
import { roleNames } from './_components/role-names';
import { homeOf } from './_components/sections';

export default async function Forbidden() {
  const actor = await requireUser();
  return <NoPermission roles={roleNames(actor.roles)} home={homeOf(actor)} />;
}
