import { openDatabase } from '@/db/client';
import type { Actor } from '@/lib/domain/roles';
import { AppError } from '@/lib/errors';
import { clearSheet } from '@/lib/services/sheet/clear-sheet';

/** A process of its own that clears a sheet at the moment it is told to, and says how that went. */
const [file, actor, input, now] = JSON.parse(process.argv[2] ?? '') as [string, Actor, unknown, number];
const db = openDatabase(file);

process.on('message', () => {
  process.send?.(outcome(), () => process.exit());
});
process.send?.('ready');

function outcome(): string {
  try {
    return clearSheet(actor, input, { db, now }).outcome;
  } catch (error) {
    return error instanceof AppError ? error.code : String(error);
  }
}
