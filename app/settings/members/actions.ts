'use server';
import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { authoriseAction } from '@/app/_server/authorise-action';
import { readForm } from '@/app/_server/read-form';
import { doneForm, failedForm, type FormState } from '@/components/accounts/form-state';
import { typedValues } from '@/components/accounts/typed-values';
import { database } from '@/db/knex';
import { changeRole, listMembers, removeMember, type MemberProblem } from '@/db/repositories/memberships';
import { roleSchema } from '@/lib/access/roles';

const problemText: Record<MemberProblem, string> = {
  'last PI': 'A group needs a PI. Make somebody else PI first.',
  'not a member': 'This person is no longer in the group. Load the page again.',
};

const roleFields = z.object({ userId: z.uuid(), role: roleSchema });

export async function changeMemberRole(_previous: FormState, form: FormData): Promise<FormState> {
  const access = await authoriseAction('manage members');
  if (!access.ok) return failedForm(access.error.message);
  const read = readForm(roleFields, form);
  if (!read.ok) return read.error;
  const { userId, role } = read.value;
  const changed = await changeRole(database(), access.value, userId, role);
  if (!changed.ok) return failedForm(problemText[changed.error]);
  revalidatePath('/settings/members');
  return doneForm(changed.value.changed ? `Now ${role}.` : 'Nothing changed.');
}

const removeFields = z.object({ userId: z.uuid(), typedName: z.string().trim() });

/** Removes a member whose name was typed as written in the table. */
export async function removeFromGroup(_previous: FormState, form: FormData): Promise<FormState> {
  const access = await authoriseAction('manage members');
  if (!access.ok) return failedForm(access.error.message);
  const read = readForm(removeFields, form);
  if (!read.ok) return read.error;
  const { userId, typedName } = read.value;
  const member = (await listMembers(database(), access.value)).find((each) => each.userId === userId);
  if (!member) return failedForm(problemText['not a member']);
  if (member.name !== typedName)
    return failedForm(null, typedValues(form), { typedName: `Type the name as written: ${member.name}` });
  const removed = await removeMember(database(), access.value, userId);
  if (!removed.ok) return failedForm(problemText[removed.error], typedValues(form));
  revalidatePath('/settings/members');
  return doneForm(`${member.name} is no longer in the group.`);
}
