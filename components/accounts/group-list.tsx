import { VisuallyHidden } from '@/components/ui/visually-hidden';
import { SubmitButton } from './submit-button';

interface GroupListProps {
  /** The current one first. */
  groups: readonly { groupId: string; groupName: string; role: string }[];
  action: (form: FormData) => Promise<void>;
}

/** The groups a person belongs to, and which of them they work in now. */
export function GroupList({ groups, action }: GroupListProps) {
  return (
    <section aria-labelledby="groups">
      <h2 id="groups" className="mb-1 border-b-2 border-ink pb-2 text-section">
        {groups.length > 1 ? 'Groups' : 'Group'}
      </h2>
      {groups.length === 0 ? (
        <p className="mt-3">
          You belong to no group. Ask a PI to invite you; the invitation comes by e-mail.
        </p>
      ) : null}
      <ul>
        {groups.map((group, index) => (
          <li
            key={group.groupId}
            className="flex min-h-14 items-center justify-between gap-4 border-b border-rule py-2"
          >
            <p>
              {group.groupName} <span className="text-ink-2">· {group.role}</span>
            </p>
            {index === 0 ? (
              <span className="text-small text-ink-2">{groups.length > 1 ? 'working here now' : ''}</span>
            ) : (
              <form action={action}>
                <input type="hidden" name="group" value={group.groupId} />
                <SubmitButton kind="default" size="small">
                  Work here<VisuallyHidden>: {group.groupName}</VisuallyHidden>
                </SubmitButton>
              </form>
            )}
          </li>
        ))}
      </ul>
    </section>
  );
}
