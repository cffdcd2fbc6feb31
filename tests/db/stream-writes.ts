/**
 * A process that writes until it is killed: each write a transaction of two rows, and its number on standard output
 * once the database has acknowledged it. Arguments: where the database is, as JSON; the workspace; the first number.
 */
import { randomUUID } from 'node:crypto';
import { writeSync } from 'node:fs';
import { openDatabase, type Place } from '@/db/client';
import { changes, studies } from '@/db/schema';

const [place = '{}', workspaceId = '', first = '1'] = process.argv.slice(2);

async function writeForEver(): Promise<void> {
  const { db } = await openDatabase(JSON.parse(place) as Place);
  for (let number = Number(first); ; number += 1) {
    const id = randomUUID();
    await db.transaction(async (tx) => {
      await tx.insert(studies).values({ id, workspaceId, title: String(number) });
      const change = { entity: 'study', entityId: id, version: 1, kind: 'create', after: { number } } as const;
      await tx.insert(changes).values({ workspaceId, studyId: id, ...change });
    });
    writeSync(1, `${number}\n`);
  }
}

void writeForEver();
