import { Checkbox } from '@/components/ui/checkbox';
import { FieldError } from '@/components/ui/field';
import { type Role, ROLE_NAMES, ROLES } from '@/lib/domain/roles';

const WHAT: Record<Role, string> = {
  reporter: 'Logs releases, drafts and files sheets.',
  editor: 'All of that; clears, sends back, pulls, lifts embargoes.',
  'copy-desk': 'Reads cleared sheets, copies them, makes embeds.',
  administrator: 'Adds people and gives out roles. Clears nothing.',
};

/** The roles of one person: several may be held together. The boxes are named `role`. */
export function RoleChoice({ id, held, error }: { id: string; held: readonly Role[]; error?: string }) {
  return (
    <fieldset className={error ? 'field field-wrong' : 'field'}>
      <legend className="field-label">Roles</legend>
      {ROLES.map((role, at) => (
        <Checkbox
          key={role}
          id={at === 0 ? id : `${id}-${role}`}
          name="role"
          value={role}
          label={ROLE_NAMES[role]}
          hint={WHAT[role]}
          defaultChecked={held.includes(role)}
          className="mb-0!"
        />
      ))}
      <FieldError id={id} error={error} />
    </fieldset>
  );
}

export function rolesIn(form: FormData): string[] {
  return form.getAll('role').map(String);
}
