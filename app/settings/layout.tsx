import type { ReactNode } from 'react';
import { currentGroups, requirePerson } from '@/app/_server/actor';
import { signOut } from '@/app/_server/session-actions';
import { SettingsTabs } from '@/components/accounts/settings-tabs';
import { initialsOf } from '@/components/accounts/initials-of';
import { Masthead } from '@/components/masthead/masthead';

const tabs = [
  { name: 'Members', href: '/settings/members' },
  { name: 'Your account', href: '/settings/account' },
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
      <div className="px-edge pt-4 pb-12">
        <SettingsTabs tabs={group ? tabs : tabs.slice(1)} />
        <main id="main" className="bg-page px-leaf py-8 max-book:px-4 max-book:py-6">
          {children}
        </main>
      </div>
    </>
  );
}
