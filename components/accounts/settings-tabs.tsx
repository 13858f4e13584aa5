'use client';
import Link from 'next/link';
import { usePathname } from 'next/navigation';

/** Index tabs on the top edge of the settings book. */
export function SettingsTabs({ tabs }: { tabs: readonly { name: string; href: string }[] }) {
  const path = usePathname();
  return (
    <nav aria-label="Settings">
      <ul className="flex gap-1 px-leaf max-book:px-2">
        {tabs.map(({ name, href }) => {
          const current = path === href;
          return (
            <li key={href}>
              <Link
                href={href}
                aria-current={current ? 'page' : undefined}
                className={`block border-t-2 px-4 py-2 no-underline ${current ? 'border-ink bg-page font-semibold' : 'border-transparent text-ink-2 hover:bg-page-sunk'}`}
              >
                {name}
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
