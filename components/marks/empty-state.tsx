import type { ComponentProps } from 'react';
import { StatePanel } from '@/components/ui/state-panel';
import { LinkMark, type LinkMarkKind } from './link-mark';

/** Nothing here yet: the open end of a mark, and what ties it. */
export function EmptyState({
  mark = 'one-ended calculated',
  ...rest
}: Omit<ComponentProps<typeof StatePanel>, 'picture'> & { mark?: LinkMarkKind }) {
  return <StatePanel picture={<LinkMark kind={mark} width={72} decorative />} {...rest} />;
}
