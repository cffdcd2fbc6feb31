'use server';
/** Forms of a workspace: members, invitations, keys, which workspace one works in, studies. */
import { redirect } from 'next/navigation';
import { z } from 'zod';
import type { FormState } from '@/openapi/schemas/form-state';
import { createKey } from '@/lib/services/keys/create-key';
import { revokeKey } from '@/lib/services/keys/revoke-key';
import { acceptAsNew, acceptInvitation } from '@/lib/services/invitations/accept-invitation';
import { invite } from '@/lib/services/invitations/invite';
import { revokeInvitation } from '@/lib/services/invitations/revoke-invitation';
import { changeRole } from '@/lib/services/members/change-role';
import { removeMember } from '@/lib/services/members/remove-member';
import { restoreStudy, trashStudy } from '@/lib/services/studies/change-study';
import { createStudy } from '@/lib/services/studies/create-study';
import { chooseWorkspace } from '@/lib/services/workspaces/choose-workspace';
import { createWorkspace } from '@/lib/services/workspaces/create-workspace';
import { deleteWorkspace } from '@/lib/services/workspaces/delete-workspace';
import { renameWorkspace } from '@/lib/services/workspaces/rename-workspace';
import { keyRequestSchema } from '@/openapi/schemas/keys';
import { studyRequestSchema } from '@/openapi/schemas/studies';
import { acting, answered, field, keepSession, keepWorkspace, parsed } from './call';
import { idField, nameField, roleField } from './fields';

const memberShape = z.object({ userId: idField, role: roleField });

export async function chooseWorkspaceAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    await keepWorkspace(await chooseWorkspace((await acting()).ctx, { id: field(form, 'workspace') }));
    return redirect('/studies');
  });
}

export async function createWorkspaceAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const named = parsed(z.object({ name: nameField }), { name: field(form, 'name') });
    await keepWorkspace(await createWorkspace((await acting()).ctx, named));
    return redirect('/studies');
  });
}

export async function renameWorkspaceAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    await renameWorkspace((await acting()).ctx, parsed(z.object({ name: nameField }), { name: field(form, 'name') }));
    return redirect('/members');
  });
}

export async function deleteWorkspaceAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    await deleteWorkspace((await acting()).ctx, { name: field(form, 'name') });
    return redirect('/studies');
  });
}

export async function inviteAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const { role } = parsed(z.object({ role: roleField }), { role: field(form, 'role') });
    await invite((await acting()).ctx, { email: field(form, 'email'), role });
    return redirect('/members?done=invited');
  });
}

export async function acceptInvitationAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    await keepWorkspace(await acceptInvitation((await acting()).ctx, { token: field(form, 'token') }));
    return redirect('/studies');
  });
}

export async function acceptAsNewAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const { ctx, agent } = await acting();
    const { name } = parsed(z.object({ name: nameField }), { name: field(form, 'name') });
    const given = { token: field(form, 'token'), name, password: field(form, 'password'), agent };
    const { workspaceId, session } = await acceptAsNew(ctx, given);
    await keepSession(session);
    await keepWorkspace(workspaceId);
    return redirect('/studies');
  });
}

export async function revokeInvitationAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    await revokeInvitation((await acting()).ctx, parsed(z.object({ id: idField }), { id: field(form, 'id') }));
    return redirect('/members');
  });
}

export async function changeRoleAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const given = { userId: field(form, 'member'), role: field(form, 'role') };
    await changeRole((await acting()).ctx, parsed(memberShape, given));
    return redirect('/members');
  });
}

export async function removeMemberAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const { ctx } = await acting();
    await removeMember(ctx, parsed(z.object({ userId: idField }), { userId: field(form, 'member') }));
    return redirect('/members');
  });
}

export async function createKeyAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const request = parsed(keyRequestSchema, {
      name: field(form, 'name'),
      scopes: form.getAll('scopes').filter((scope) => typeof scope === 'string'),
      days: Number(field(form, 'days')),
    });
    const { secret } = await createKey((await acting()).ctx, request);
    return `The key, shown this once: ${secret}`;
  });
}

export async function revokeKeyAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    await revokeKey((await acting()).ctx, { id: field(form, 'id') });
    return redirect('/keys');
  });
}

export async function createStudyAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const request = parsed(studyRequestSchema, { title: field(form, 'title'), summary: field(form, 'summary') });
    const { id } = await createStudy((await acting()).ctx, request);
    return redirect(`/studies/${id}`);
  });
}

export async function trashStudyAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    await trashStudy((await acting()).ctx, { id: field(form, 'id'), version: Number(field(form, 'version')) });
    return redirect('/studies');
  });
}

export async function restoreStudyAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const { id } = await restoreStudy((await acting()).ctx, { id: field(form, 'id') });
    return redirect(`/studies/${id}`);
  });
}
