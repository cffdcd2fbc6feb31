/** Signing up and in, and the end of sessions, as a browser would meet them. */
import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { latestMail } from '@/db/queries/mail';
import { VISITOR } from '@/lib/actor';
import { sealSession } from '@/lib/auth/session-actor';
import { askEmailChange } from '@/lib/services/accounts/ask-email-change';
import { changePassword } from '@/lib/services/accounts/change-password';
import { confirmEmailChange } from '@/lib/services/accounts/confirm-email-change';
import { deleteAccount } from '@/lib/services/accounts/delete-account';
import { exportAccount } from '@/lib/services/accounts/export-account';
import { readLink } from '@/lib/services/accounts/read-link';
import { sendLink } from '@/lib/services/accounts/send-link';
import { signIn } from '@/lib/services/accounts/sign-in';
import { signInByLink } from '@/lib/services/accounts/sign-in-by-link';
import { signUp } from '@/lib/services/accounts/sign-up';
import { endOtherSignIns } from '@/lib/services/sign-ins/end-other-sign-ins';
import { endSignIn } from '@/lib/services/sign-ins/end-sign-in';
import { listSignIns } from '@/lib/services/sign-ins/list-sign-ins';
import { actorOf, contextFor, linkTo, signedIn } from '@/tests/support/acting';
import { freshWorld, type World } from '@/tests/support/world';

const ADDRESS = 'ada.reed@waypost.test';
const PASSWORD = 'four quiet rooks';
const FROM = { address: '192.0.2.1', agent: 'a test' } as const;
const MINUTE_MS = 60_000;

let world: World;

beforeAll(async () => {
  world = await freshWorld();
});
afterAll(() => world.close());
beforeEach(async () => {
  await world.db.execute(sql`truncate users, workspaces, rate_limits, mail, verification_tokens cascade`);
});

/** Asks for a link and takes its token. */
async function link(email = ADDRESS, path = 'sign-up'): Promise<string> {
  await sendLink(contextFor(world.db), { email, address: FROM.address, next: '/studies' });
  return linkTo(world.db, email, path);
}

/** An account made as people make one; its sealed session. */
async function account(email = ADDRESS, name = 'Ada Reed'): Promise<string> {
  return signUp(contextFor(world.db), { token: await link(email), name, password: PASSWORD, agent: FROM.agent });
}

const withPassword = (password: string, email = ADDRESS) => signIn(contextFor(world.db), { email, password, ...FROM });

describe('signing up', () => {
  it('makes an account with a workspace of its own, and signs it in', async () => {
    expect(await actorOf(await account())).toMatchObject({ kind: 'person', name: 'Ada Reed', role: 'owner' });
  });

  it('uses the link up: the second time it is good no more', async () => {
    const token = await link();
    const given = { token, name: 'Ada Reed', password: PASSWORD, agent: null };
    await signUp(contextFor(world.db), given);
    await expect(signUp(contextFor(world.db), given)).rejects.toMatchObject({ code: 'not-found' });
  });

  it('keeps the link good where the password is too short', async () => {
    const token = await link();
    const given = { token, name: 'Ada Reed', password: 'short', agent: null };
    await expect(signUp(contextFor(world.db), given)).rejects.toMatchObject({ code: 'invalid-request' });
    expect(await readLink(contextFor(world.db), { purpose: 'sign-up', token })).toBe(ADDRESS);
  });

  it('takes no link that is 31 minutes old, and none of another purpose', async () => {
    const token = await link();
    const later = contextFor(world.db, VISITOR, () => new Date(Date.now() + 31 * MINUTE_MS));
    await expect(readLink(later, { purpose: 'sign-up', token })).rejects.toMatchObject({ code: 'not-found' });
    await expect(readLink(contextFor(world.db), { purpose: 'sign-in', token })).rejects.toMatchObject({
      code: 'not-found',
    });
  });

  it('of two who use one link at once makes one account', async () => {
    const token = await link();
    const given = { token, name: 'Ada Reed', password: PASSWORD, agent: null };
    const both = await Promise.allSettled([signUp(contextFor(world.db), given), signUp(contextFor(world.db), given)]);
    expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
  });

  it('in other dress of the same address leads to the same account', async () => {
    await account();
    await sendLink(contextFor(world.db), { email: 'ADA.Reed@WAYPOST.test', address: undefined, next: '/' });
    expect(await linkTo(world.db, ADDRESS, 'sign-in')).toBeTruthy();
  });
});

describe('signing in', () => {
  it('takes the right password and, of a link, one use', async () => {
    await account();
    expect(await actorOf(await withPassword(PASSWORD))).toMatchObject({ kind: 'person' });
    const token = await link(ADDRESS, 'sign-in');
    expect(await actorOf(await signInByLink(contextFor(world.db), { token, agent: null }))).toMatchObject({
      kind: 'person',
    });
    await expect(signInByLink(contextFor(world.db), { token, agent: null })).rejects.toMatchObject({
      code: 'not-found',
    });
  });

  it('says the same of a wrong password as of no account', async () => {
    await account();
    const refusals = await Promise.all(
      [withPassword('something else'), withPassword(PASSWORD, 'nobody@waypost.test')].map((each) =>
        each.catch((error: Error & { code?: string }) => [error.code, error.message]),
      ),
    );
    expect(refusals[0]).toEqual(refusals[1]);
    expect(refusals[0]?.[0]).toBe('not-signed-in');
  });

  it('keeps no password and no token as it came', async () => {
    const session = await account();
    await link(ADDRESS, 'sign-in').catch(() => undefined);
    const kept = JSON.stringify([
      await world.db.query.users.findMany(),
      await world.db.query.signIns.findMany(),
      await world.db.query.verificationTokens.findMany(),
    ]);
    for (const secret of [PASSWORD, session, await linkTo(world.db, ADDRESS, 'sign-in')]) {
      expect(kept).not.toContain(secret);
    }
    expect(kept).toContain('$argon2id$v=19$m=19456,t=2,p=1$');
  });

  it('takes ten tries for an account in a quarter of an hour, then none, not even the right one', async () => {
    await account();
    for (let tries = 1; tries <= 10; tries++) {
      await expect(withPassword('wrong')).rejects.toMatchObject({ code: 'not-signed-in' });
    }
    await expect(withPassword(PASSWORD)).rejects.toMatchObject({
      code: 'too-many-requests',
      headers: { 'Retry-After': '900' },
    });
    const later = contextFor(world.db, VISITOR, () => new Date(Date.now() + 16 * MINUTE_MS));
    expect(await signIn(later, { email: ADDRESS, password: PASSWORD, ...FROM })).toBeTruthy();
  });

  it('counts tries for an account that does not exist in the same way', async () => {
    for (let tries = 1; tries <= 10; tries++) await withPassword('wrong', 'nobody@waypost.test').catch(() => undefined);
    await expect(withPassword('wrong', 'nobody@waypost.test')).rejects.toMatchObject({ code: 'too-many-requests' });
  });

  it('takes sixty tries from one network address, whatever the account', async () => {
    const tried = async (account: number) =>
      sendLink(contextFor(world.db), { email: `a${account}@waypost.test`, address: '192.0.2.9', next: '/' });
    for (let tries = 1; tries <= 60; tries++) await tried(tries);
    await expect(tried(61)).rejects.toMatchObject({ code: 'too-many-requests' });
    await expect(
      sendLink(contextFor(world.db), { email: 'a61@waypost.test', address: '192.0.2.10', next: '/' }),
    ).resolves.toBeUndefined();
  });

  it('forgets the tries before a right one', async () => {
    await account();
    for (let round = 0; round < 2; round++) {
      for (let tries = 1; tries <= 9; tries++) await withPassword('wrong').catch(() => undefined);
      expect(await withPassword(PASSWORD)).toBeTruthy();
    }
  });
});

describe('a session', () => {
  it('ends at once', async () => {
    const [first, second] = [await account(), await withPassword(PASSWORD)];
    const ctx = await signedIn(world.db, first);
    const other = (await listSignIns(ctx)).find(({ isThis }) => !isThis);
    await endSignIn(ctx, { id: other?.id ?? '' });
    expect(await actorOf(second)).toEqual(VISITOR);
    expect(await actorOf(first)).toMatchObject({ kind: 'person' });
    expect(await listSignIns(ctx)).toHaveLength(1);
  });

  it('of others ends, all but the one that asks', async () => {
    const sessions = [await account(), await withPassword(PASSWORD), await withPassword(PASSWORD)];
    expect(await endOtherSignIns(await signedIn(world.db, sessions[0] ?? ''))).toBe(2);
    const kinds = await Promise.all(sessions.map(async (each) => (await actorOf(each)).kind));
    expect(kinds).toEqual(['person', 'visitor', 'visitor']);
  });

  it('of another person cannot be ended, and is told apart from none by nothing', async () => {
    const mine = await signedIn(world.db, await account());
    const theirs = await signedIn(world.db, await account('tam.hale@waypost.test', 'Tam Hale'));
    const [session] = await listSignIns(theirs);
    const refusals = await Promise.all(
      [session?.id ?? '', '00000000-0000-4000-8000-000000000000'].map((id) =>
        endSignIn(mine, { id }).catch((error: Error & { code?: string }) => [error.code, error.message]),
      ),
    );
    expect(refusals[0]).toEqual(refusals[1]);
    expect(await listSignIns(theirs)).toHaveLength(1);
  });

  it('ends with a new password, and the new one signs in', async () => {
    const [first, second] = [await account(), await withPassword(PASSWORD)];
    const given = { present: PASSWORD, password: 'five loud bishops', agent: null };
    const renewed = await changePassword(await signedIn(world.db, first), given);
    expect([await actorOf(first), await actorOf(second)]).toEqual([VISITOR, VISITOR]);
    expect(await actorOf(renewed)).toMatchObject({ kind: 'person' });
    await expect(withPassword(PASSWORD)).rejects.toMatchObject({ code: 'not-signed-in' });
    expect(await withPassword('five loud bishops')).toBeTruthy();
  });

  it('that was tampered with is nobody’s, at every place of it', async () => {
    const sealed = await account();
    for (let place = 0; place < sealed.length; place += 9) {
      // The last letter of a part of base64url has bits that stand for nothing; the one before it has none.
      const at = sealed[place + 1] === '.' || place === sealed.length - 1 ? place - 1 : place;
      const letter = sealed[at] === 'A' ? 'B' : 'A';
      expect(await actorOf(`${sealed.slice(0, at)}${letter}${sealed.slice(at + 1)}`), `at ${at}`).toEqual(VISITOR);
    }
    for (const text of ['', '%', '%ZZ', 'a.b.c.d.e', '"', 'null', sealed.slice(0, -20), `${sealed}.x`]) {
      expect(await actorOf(text), text).toEqual(VISITOR);
    }
  });

  it('sealed for another person’s row is nobody’s', async () => {
    const mine = await actorOf(await account());
    const theirs = await actorOf(await account('tam.hale@waypost.test', 'Tam Hale'));
    if (mine.kind !== 'person' || theirs.kind !== 'person') throw new Error('both are signed in');
    const mixed = await sealSession({ userId: mine.userId, signInId: theirs.signInId, tokenVersion: 1 });
    expect(await actorOf(mixed)).toEqual(VISITOR);
  });

  it('of somebody who deleted the account is nobody’s, and the address is free again', async () => {
    const session = await account();
    await deleteAccount(await signedIn(world.db, session), { present: PASSWORD, email: ADDRESS });
    expect(await actorOf(session)).toEqual(VISITOR);
    const kept = JSON.stringify([await world.db.query.users.findMany(), await latestMail(world.db, 50)]);
    for (const personal of [ADDRESS, 'Ada Reed', 'argon2']) expect(kept).not.toContain(personal);
    expect(await actorOf(await account())).toMatchObject({ kind: 'person' });
  });
});

describe('one’s own account', () => {
  it('gets another address by the link that goes to it, once', async () => {
    const ctx = await signedIn(world.db, await account());
    await askEmailChange(ctx, { email: 'Ada@waypost.test', present: PASSWORD });
    const token = await linkTo(world.db, 'ada@waypost.test', 'settings/email');
    expect(await withPassword(PASSWORD)).toBeTruthy();
    await confirmEmailChange(ctx, { token });
    expect(await withPassword(PASSWORD, 'ada@waypost.test')).toBeTruthy();
    await expect(withPassword(PASSWORD)).rejects.toMatchObject({ code: 'not-signed-in' });
    await expect(confirmEmailChange(ctx, { token })).rejects.toMatchObject({ code: 'not-found' });
  });

  it('tells the present address, and asks for the present password', async () => {
    const ctx = await signedIn(world.db, await account());
    await expect(askEmailChange(ctx, { email: 'b@waypost.test', present: 'wrong' })).rejects.toMatchObject({
      code: 'invalid-request',
    });
    await askEmailChange(ctx, { email: 'b@waypost.test', present: PASSWORD });
    const told = (await latestMail(world.db, 50)).filter(({ to, subject }) => to === ADDRESS && /change/.test(subject));
    expect(told).toHaveLength(1);
  });

  it('cannot take an address that has an account, nor the link of another person', async () => {
    const mine = await signedIn(world.db, await account());
    const theirs = await signedIn(world.db, await account('tam.hale@waypost.test', 'Tam Hale'));
    await askEmailChange(mine, { email: 'tam.hale@waypost.test', present: PASSWORD });
    const token = await linkTo(world.db, 'tam.hale@waypost.test', 'settings/email');
    await expect(confirmEmailChange(theirs, { token })).rejects.toMatchObject({ code: 'not-found' });
    await expect(confirmEmailChange(mine, { token })).rejects.toMatchObject({ code: 'conflict' });
    expect(await withPassword(PASSWORD, 'tam.hale@waypost.test')).toBeTruthy();
  });

  it('can be taken along: one’s own, and no secret', async () => {
    const ctx = await signedIn(world.db, await account());
    const data = JSON.stringify(await exportAccount(ctx));
    for (const own of [ADDRESS, 'Ada Reed', 'a test', 'owner']) expect(data).toContain(own);
    for (const secret of ['argon2', 'passwordHash', 'tokenVersion']) expect(data).not.toContain(secret);
  });
});
