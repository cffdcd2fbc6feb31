/** One process at a time on the embedded folder. */
import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { connect, createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { askFolder, FolderHeld, lockFolder } from '@/db/folder-lock';

const parent = mkdtempSync(join(tmpdir(), 'waypost-lock-'));
afterAll(() => rmSync(parent, { recursive: true, force: true }));

let folders = 0;
function newFolder(): string {
  folders += 1;
  return join(parent, `data${folders}`);
}

/** Another process that tries for the lock at a given time, says `held` or whom it met, and keeps it until it is killed. */
const OTHER = `
import { lockFolder } from './db/folder-lock.ts';
const [folder, at] = process.argv.slice(2);
await new Promise((resolve) => setTimeout(resolve, Number(at) - Date.now()));
try {
  await lockFolder(folder);
  console.log('held');
  setInterval(() => undefined, 1_000);
} catch (error) {
  console.log('refused ' + error.pid);
}
`;

interface Other {
  readonly pid: number;
  readonly said: Promise<string>;
  readonly kill: () => Promise<void>;
}

function other(folder: string, at = 0): Other {
  const file = join(parent, 'other.mts');
  writeFileSync(file, OTHER.replace("'./db", `'${process.cwd()}/db`));
  const child: ChildProcess = spawn(process.execPath, ['--import', 'tsx', file, folder, String(at)], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const said = new Promise<string>((resolve) => {
    child.stdout?.once('data', (part) => resolve(String(part).trim()));
    child.once('close', () => resolve('ended without a word'));
  });
  const closed = new Promise<void>((resolve) => child.once('close', () => resolve()));
  return {
    pid: child.pid ?? 0,
    said,
    kill: async () => {
      child.kill('SIGKILL');
      await closed;
    },
  };
}

describe('the lock of the data folder', () => {
  it('refuses a second process and names the first', { timeout: 30_000 }, async () => {
    const folder = newFolder();
    const first = other(folder);
    expect(await first.said).toBe('held');
    const refusal = lockFolder(folder);
    await expect(refusal).rejects.toThrow(FolderHeld);
    await expect(refusal).rejects.toThrow(`${folder} is in use by process ${first.pid}`);
    console.log(`a second process on one folder: ${await refusal.catch((error: Error) => error.message)}`);
    await first.kill();
  });

  it('refuses a second time in the same process', async () => {
    const folder = newFolder();
    const lock = await lockFolder(folder);
    await expect(lockFolder(folder)).rejects.toMatchObject({ pid: process.pid });
    await lock.release();
    await (await lockFolder(folder)).release();
  });

  it('is free again when its process was killed', { timeout: 30_000 }, async () => {
    const folder = newFolder();
    const first = other(folder);
    expect(await first.said).toBe('held');
    await first.kill();
    const lock = await lockFolder(folder);
    await lock.release();
  });

  it('leaves one file beside the folder, however often it was taken', async () => {
    const folder = newFolder();
    for (let time = 0; time < 12; time += 1) await (await lockFolder(folder)).release();
    expect(readdirSync(parent).filter((name) => name.startsWith(`data${folders}.`))).toEqual([
      `data${folders}.lock-12`,
    ]);
  });

  it('goes to exactly one of six that start at once over a dead one', { timeout: 60_000 }, async () => {
    const folder = newFolder();
    await (await lockFolder(folder)).release();
    for (let round = 0; round < 2; round += 1) {
      const at = Date.now() + 2_500;
      const all = Array.from({ length: 6 }, () => other(folder, at));
      const said = await Promise.all(all.map((one) => one.said));
      const holder = all[said.indexOf('held')];
      expect(said.filter((words) => words !== `refused ${holder?.pid}`)).toEqual(['held']);
      await Promise.all(all.map((one) => one.kill()));
    }
  });

  it('goes to exactly one of many in one process, time after time', async () => {
    const folder = newFolder();
    for (let time = 0; time < 20; time += 1) {
      const tries = await Promise.allSettled(Array.from({ length: 8 }, () => lockFolder(folder)));
      const held = tries.filter((one) => one.status === 'fulfilled');
      expect(held).toHaveLength(1);
      await Promise.all(held.map((one) => one.value.release()));
    }
  });

  it('counts a holder who does not say its name as a holder', async () => {
    const folder = newFolder();
    const silent = createServer();
    await new Promise<void>((resolve) => silent.listen(`${folder}.lock-3`, resolve));
    await expect(lockFolder(folder)).rejects.toThrow(`${folder} is in use by another process`);
    silent.close();
  });

  it('lets others ask its holder, who answers when it wants to', async () => {
    const folder = newFolder();
    expect(await askFolder(folder, 'anything')).toBeUndefined();
    const lock = await lockFolder(folder);
    expect(await askFolder(folder, 'too early')).toBeUndefined();
    lock.answerWith(async (request) => `heard ${request}`);
    const asked = ['a', 'päth/with "signs"', 'c'];
    const answers = await Promise.all(asked.map((request) => askFolder(folder, request)));
    expect(answers).toEqual(asked.map((request) => `heard ${request}`));
    lock.answerWith(async () => {
      throw new Error('a mistake');
    });
    expect(await askFolder(folder, 'x')).toBeUndefined();
    await lock.release();
    expect(await askFolder(folder, 'too late')).toBeUndefined();
  });

  it('is given back though somebody is connected and says nothing', async () => {
    const folder = newFolder();
    const lock = await lockFolder(folder);
    const silent = connect(`${folder}.lock-1`);
    await new Promise((resolve) => silent.once('data', resolve));
    await lock.release();
    await (await lockFolder(folder)).release();
  });

  it('refuses a path that no socket can have', async () => {
    await expect(lockFolder(join(parent, 'x'.repeat(90)))).rejects.toThrow('80 bytes at most');
  });
});
