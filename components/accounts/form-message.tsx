import { Notice } from '@/components/ui/notice';
import type { FormState } from './form-state';

/** The outcome of a form, spoken as soon as it is there. */
export function FormMessage({ state }: { state: Pick<FormState, 'status' | 'message'> }) {
  if (!state.message) return null;
  return <Notice live kind={state.status === 'failed' ? 'error' : 'info'} title={state.message} />;
}
