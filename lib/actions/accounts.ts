'use server';
/** Forms of signing up, in and out, and of one's own account. */
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { askEmailChange } from '@/lib/services/accounts/ask-email-change';
import { changePassword } from '@/lib/services/accounts/change-password';
import { confirmEmailChange } from '@/lib/services/accounts/confirm-email-change';
import { deleteAccount } from '@/lib/services/accounts/delete-account';
import { renameAccount } from '@/lib/services/accounts/rename-account';
import { sendLink } from '@/lib/services/accounts/send-link';
import { signIn } from '@/lib/services/accounts/sign-in';
import { signInByLink } from '@/lib/services/accounts/sign-in-by-link';
import { signUp } from '@/lib/services/accounts/sign-up';
import { endOtherSignIns } from '@/lib/services/sign-ins/end-other-sign-ins';
import { endSignIn } from '@/lib/services/sign-ins/end-sign-in';
import { ownPath } from '@/lib/site-address';
import { acting, answered, dropSession, field, keepSession, parsed } from './call';
import { idField, nameField } from './fields';
import type { FormState } from '@/openapi/schemas/form-state';

const HOME = '/studies';

/** Where a form leads after it. */
function nextPage(form: FormData): string {
  return ownPath(field(form, 'next'), HOME);
}

export async function sendLinkAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const { ctx, address } = await acting();
    await sendLink(ctx, { email: field(form, 'email'), address, next: nextPage(form) });
    return 'A message with a link is on its way to this address.';
  });
}

export async function signUpAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const { ctx, agent } = await acting();
    const { name } = parsed(z.object({ name: nameField }), { name: field(form, 'name') });
    await keepSession(
      await signUp(ctx, { token: field(form, 'token'), name, password: field(form, 'password'), agent }),
    );
    return redirect(nextPage(form));
  });
}

export async function signInAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const { ctx, address, agent } = await acting();
    const given = { email: field(form, 'email'), password: field(form, 'password') };
    await keepSession(await signIn(ctx, { ...given, address, agent }));
    return redirect(nextPage(form));
  });
}

export async function signInByLinkAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const { ctx, agent } = await acting();
    await keepSession(await signInByLink(ctx, { token: field(form, 'token'), agent }));
    return redirect(nextPage(form));
  });
}

export async function signOutAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const { ctx } = await acting();
    if (ctx.actor.kind === 'person') await endSignIn(ctx, { id: ctx.actor.signInId });
    await dropSession();
    return redirect('/');
  });
}

export async function renameAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    await renameAccount((await acting()).ctx, parsed(z.object({ name: nameField }), { name: field(form, 'name') }));
    return redirect('/settings?done=name');
  });
}

export async function changePasswordAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const { ctx, agent } = await acting();
    const given = { present: field(form, 'present'), password: field(form, 'password') };
    await keepSession(await changePassword(ctx, { ...given, agent }));
    return 'Saved. You stay signed in here; every other session is ended.';
  });
}

export async function askEmailChangeAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const given = { email: field(form, 'email'), present: field(form, 'present') };
    await askEmailChange((await acting()).ctx, given);
    return 'A message is on its way to the new address. Nothing changes before its link is followed.';
  });
}

export async function confirmEmailAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    await confirmEmailChange((await acting()).ctx, { token: field(form, 'token') });
    return redirect('/settings?done=email');
  });
}

export async function endSessionAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    await endSignIn((await acting()).ctx, parsed(z.object({ id: idField }), { id: field(form, 'id') }));
    return redirect('/sessions');
  });
}

export async function endOtherSessionsAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const count = await endOtherSignIns((await acting()).ctx);
    return redirect(`/sessions?ended=${count}`);
  });
}

export async function deleteAccountAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    await deleteAccount((await acting()).ctx, { present: field(form, 'present'), email: field(form, 'email') });
    await dropSession();
    return redirect('/');
  });
}
