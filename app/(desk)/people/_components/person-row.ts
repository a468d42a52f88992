import type { Role } from '@/lib/domain/roles';
import type { ActionResult } from '@/lib/errors';

/** One person as the list hands it to the browser. */
export type PersonRow = {
  id: string;
  name: string;
  roles: readonly Role[];
  state: 'active' | 'invited' | 'disabled';
  version: number;
  /** Whoever is looking: a change of oneself loads a whole new page. */
  isSelf: boolean;
};

type Target = { id: string; version: number };

export type PersonActions = {
  setRoles: (input: Target & { roles: string[] }) => Promise<ActionResult<void>>;
  setDisabled: (input: Target & { disabled: boolean }) => Promise<ActionResult<void>>;
  renewCode: (input: Target) => Promise<ActionResult<{ code: string }>>;
};
