'use client';
import { usePathname } from 'next/navigation';
import { IndexTabs } from '@/components/ledger/index-tabs';

/** Index tabs on the top edge of the settings. */
export function SettingsTabs({ tabs }: { tabs: readonly { label: string; href: string }[] }) {
  const path = usePathname();
  return <IndexTabs label="Settings" tabs={tabs.map((tab) => ({ ...tab, current: tab.href === path }))} />;
}
