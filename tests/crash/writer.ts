import { databaseFile, openDatabase } from '@/db/client';
import { findPersonByPublicId } from '@/db/queries/person';
import type { Actor } from '@/lib/domain/roles';
import { newId } from '@/lib/security/ids';
import { createEmbed } from '@/lib/services/embed/create-embed';
import { storeFile } from '@/lib/services/files/store-file';
import { createRelease } from '@/lib/services/release/create-release';
import { liftEmbargo } from '@/lib/services/release/embargo';
import { clearSheet } from '@/lib/services/sheet/clear-sheet';
import { createSheet } from '@/lib/services/sheet/create-sheet';
import { fileSheet } from '@/lib/services/sheet/file-sheet';
import { getSheet } from '@/lib/services/sheet/get-sheet';
import { pullSheet } from '@/lib/services/sheet/pull-sheet';
import { diskStore } from '@/lib/storage/disk-store';
import { releaseForm, sharesOf } from '@/tests/support/release';
import type { Told } from './told';

/** A newsroom that never pauses, as a process to be killed: each line it prints is an act that was accepted. */
const [folder = '', reporterId = '', editorId = '', round = '0'] = process.argv.slice(2);
const db = openDatabase(databaseFile(folder));
const store = diskStore(`${folder}/files`);

const now = () => ({ db, now: Date.now() });
const tell = (told: Told) => process.stdout.write(`${JSON.stringify(told)}\n`);

function actorOf(publicId: string): Actor {
  const person = findPersonByPublicId(db, publicId);
  if (!person) throw new Error(`there is no person ${publicId}`);
  return { personId: person.id, publicId, name: person.name, roles: person.roles, sessionId: 0 };
}

async function work(reporter: Actor, editor: Actor, at: number): Promise<void> {
  const name = `Race ${round}-${at}`;
  const lead = 46 + (at % 8);
  const isHeld = at % 3 === 0;
  const release = releaseForm({
    race: { kind: 'new', race: { name, kind: 'candidate', options: ['Alder', 'Brook'], thresholds: [] } },
    shares: sharesOf([
      ['Alder', String(lead)],
      ['Brook', String(88 - lead)],
      ['Don’t know', '12', false],
    ]),
    embargo: isHeld ? { local: '2099-01-01T06:00', zone: 'Etc/UTC' } : null,
  });
  const { id } = createRelease(reporter, { submissionKey: newId(), release }, now());
  tell({ act: 'logged', id });
  const draft = { submissionKey: newId(), releaseId: id, claimKey: 'lead:Alder|Brook' };
  const sheet = createSheet(reporter, draft, now()).id;
  const { version, basisHash, lines } = getSheet(reporter, sheet, now());
  const edits = lines.map(({ kind, text, knockedOut }) => ({ kind, text, knockedOut }));
  const { hash } = fileSheet(reporter, { id: sheet, version, basisHash, lines: edits }, now());
  tell({ act: 'filed', id: sheet });
  clearSheet(editor, { id: sheet, hash }, now());
  tell({ act: 'cleared', id: sheet });
  const embed = createEmbed(editor, { sheetId: sheet }, now()).id;
  tell({ act: 'embedded', id: embed });
  if (isHeld) {
    liftEmbargo(editor, { id, version: 1, reason: 'The pollster published it early.' }, now());
    tell({ act: 'lifted', id });
  }
  if (at % 2 === 0) {
    pullSheet(editor, { id: sheet, reason: 'A batch of interviews is checked again.' }, now());
    tell({ act: 'pulled', id: sheet });
  }
  const file = await storeFile(reporter, Buffer.from(`press note of ${name}`), now(), store);
  tell({ act: 'stored', id: file.hash });
}

for (let at = 0; ; at += 1) await work(actorOf(reporterId), actorOf(editorId), at);
