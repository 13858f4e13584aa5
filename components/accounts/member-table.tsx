'use client';
import { Select } from '@/components/ui/select';
import { VisuallyHidden } from '@/components/ui/visually-hidden';
import { FormMessage } from './form-message';
import { LocalTime } from './local-time';
import { RemoveMember } from './remove-member';
import { RoleOptions } from './role-options';
import { SubmitButton } from './submit-button';
import { useFormAction, type FormAction } from './use-form-action';

export interface MemberLine {
  userId: string;
  name: string;
  /** Null where the viewer may not see it. */
  email: string | null;
  role: string;
  joinedAt: string;
  you: boolean;
}

interface MemberTableProps {
  members: readonly MemberLine[];
  roles: readonly string[];
  /** Null for people who may only look. */
  changeRole: FormAction | null;
  remove: FormAction | null;
}

/** Everybody in the group, with what may be changed about them. */
export function MemberTable({ members, roles, changeRole, remove }: MemberTableProps) {
  return (
    <ul
      aria-label="Members"
      className="border-b border-rule border-t-2 border-t-ink [&>li:first-child]:border-t-0"
    >
      {members.map((member) => (
        <li
          key={member.userId}
          className="grid items-start gap-x-6 gap-y-3 border-t border-rule py-3 book:grid-cols-[minmax(0,1fr)_minmax(0,22rem)]"
        >
          <div className="min-w-0">
            <p className="text-lead">
              {member.name}
              {member.you ? <span className="text-ink-2"> (you)</span> : null}
            </p>
            <p className="text-small break-words text-ink-2">
              {member.email ? `${member.email} · ` : ''}since <LocalTime iso={member.joinedAt} />
            </p>
          </div>
          {changeRole && remove ? (
            <div className="grid gap-2">
              <RoleForm member={member} roles={roles} action={changeRole} />
              <RemoveMember member={member} action={remove} />
            </div>
          ) : (
            <p>{member.role}</p>
          )}
        </li>
      ))}
    </ul>
  );
}

function RoleForm({
  member,
  roles,
  action,
}: {
  member: MemberLine;
  roles: readonly string[];
  action: FormAction;
}) {
  const [state, submit] = useFormAction(action);
  return (
    <form action={submit} className="grid gap-2">
      <input type="hidden" name="userId" value={member.userId} />
      <div className="grid grid-cols-[minmax(0,1fr)_max-content] items-end gap-2">
        {/* The key lets the choice follow a role that was changed. */}
        <Select
          key={member.role}
          label={<VisuallyHidden>Role of {member.name}</VisuallyHidden>}
          name="role"
          defaultValue={member.role}
        >
          <RoleOptions roles={roles} />
        </Select>
        <SubmitButton kind="default" pending="Changing …">
          Change role
        </SubmitButton>
      </div>
      <FormMessage state={state} />
    </form>
  );
}
