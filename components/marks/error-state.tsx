import type { ComponentProps } from 'react';
import { StatePanel } from '@/components/ui/state-panel';
import { LinkMark } from './link-mark';

/** Something broke: say what, where (file, line, field) and what to do. Announced at once. */
export function ErrorState(props: Omit<ComponentProps<typeof StatePanel>, 'picture' | 'role'>) {
  return <StatePanel role="alert" picture={<LinkMark kind="broken" width={72} decorative />} {...props} />;
}
