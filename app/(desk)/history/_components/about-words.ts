/** A person by name; a release, sheet or embed by what it is and whose poll; anything else by what it is. */
export function aboutWords({ entity, about }: { entity: string; about: string | null }): string {
  if (about === null) return entity;
  return entity === 'person' ? about : `${entity}: ${about}`;
}
