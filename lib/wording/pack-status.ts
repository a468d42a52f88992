import type { Language } from '@/lib/domain/vocabulary';

/**
 * How far a pack as shipped may be used. What is drafted with an `unreviewed` one is not cleared until a named native
 * editor of the desk has signed its sentences as they are in force; signatures are kept with the desk's house style.
 */
export type PackStatus = {
  language: Language;
  /** Moves on with every changed message. */
  version: string;
  status: 'reviewed-here' | 'unreviewed';
};

/** The packs as they ship. */
export const PACK_STATUS: Record<Language, PackStatus> = {
  en: { language: 'en', version: '1.2.0', status: 'reviewed-here' },
  es: { language: 'es', version: '1.1.0', status: 'unreviewed' },
  fr: { language: 'fr', version: '1.1.0', status: 'unreviewed' },
  de: { language: 'de', version: '1.1.0', status: 'unreviewed' },
};
