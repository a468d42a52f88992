import { readRoute } from '@/lib/auth/desk-route';
import { getSheetData } from '@/lib/services/sheet/sheet-data';

/** One sheet as data, shaped by the role of whoever is signed in. */
export const GET = readRoute((actor, { id }, ctx) => getSheetData(actor, id ?? '', ctx));
