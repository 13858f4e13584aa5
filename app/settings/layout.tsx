import type { ReactNode } from 'react';
import { currentGroups, requirePerson } from '@/app/_server/actor';
import { signOut } from '@/app/_server/session-actions';
import { SettingsTabs } from '@/components/accounts/settings-tabs';
import { initialsOf } from '@/components/accounts/initials-of';
import { Book } from '@/components/ledger/book';
import { Masthead } from '@/components/masthead/masthead';

const tabs = [
  { label: 'Members', href: '/settings/members' },
  { label: 'Your account', href: '/settings/account' },
];

export default async function SettingsLayout({ children }: { children: ReactNode }) {
  const person = await requirePerson();
  const group = (await currentGroups())[0];
  const places = [...(group ? [{ name: group.groupName, href: '/' }] : []), { name: 'Settings' }];
  const role = group?.role ?? 'in no group';
  return (
    <>
      <Masthead
        places={places}
        people={[{ initials: initialsOf(person.name), name: person.name, role, current: true }]}
        peopleLabel="Signed in"
        searchAction={group ? undefined : null}
      >
        <form action={signOut}>
          <button type="submit" className="text-small underline decoration-rule-strong underline-offset-3">
            Sign out
          </button>
        </form>
      </Masthead>
      <SettingsTabs tabs={group ? tabs : tabs.slice(1)} />
      <Book>
        <main id="main" className="px-7 pt-7 pb-9 max-book:px-3.5 max-book:pt-5">
          {children}
        </main>
      </Book>
      <div className="h-12" />
    </>
  );
}
