'use server';
/** Forms inside a study, and the keeping of what the public pages compute. */
import { redirect } from 'next/navigation';
import type { FormState } from '@/openapi/schemas/form-state';
import { createPosition } from '@/lib/services/studies/create-position';
import { trashPosition } from '@/lib/services/studies/position-changes';
import { readPositionOf } from '@/lib/services/studies/read-study';
import { positionRequestSchema } from '@/openapi/schemas/studies';
import { AppError } from '@/lib/errors';
import { acting, answered, field } from './call';

export async function addPositionAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const request = positionRequestSchema.safeParse({ fen: field(form, 'fen').trim(), title: field(form, 'title') });
    if (!request.success) throw new AppError('invalid-request', request.error.issues[0]?.message ?? 'Not understood.');
    const id = field(form, 'study');
    await createPosition((await acting()).ctx, { id, ...request.data });
    return redirect(`/studies/${id}`);
  });
}

export async function trashPositionAction(_: FormState, form: FormData): Promise<FormState> {
  return answered(form, async () => {
    const { ctx } = await acting();
    const place = { id: field(form, 'study'), positionId: field(form, 'position') };
    const { version } = await readPositionOf(ctx, place);
    await trashPosition(ctx, { ...place, version });
    return redirect(`/studies/${place.id}`);
  });
}
