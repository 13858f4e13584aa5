import { initialsOf } from '@/components/accounts/initials-of';
import { Masthead, type Place } from '@/components/masthead/masthead';

/** The masthead of a signed-in page: where one is, who one is, the way to settings and out. */
export function SignedInMasthead({
  person,
  places,
  signOut,
}: {
  person: { name: string; role: string };
  places: readonly Place[];
  signOut: () => Promise<void>;
}) {
  const link = 'text-small underline decoration-rule-strong underline-offset-3';
  return (
    <Masthead
      places={places}
      people={[{ initials: initialsOf(person.name), name: person.name, role: person.role, current: true }]}
      peopleLabel="Signed in"
      searchAction={null}
    >
      <a href="/settings/members" className={link}>
        Settings
      </a>
      <form action={signOut}>
        <button type="submit" className={link}>
          Sign out
        </button>
      </form>
    </Masthead>
  );
}
