import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { Book } from '@/components/ledger/book';
import { Masthead } from '@/components/masthead/masthead';
import { ControlsSections } from './controls-sections';
import { LedgerSections } from './ledger-sections';
import { MarksSections } from './marks-sections';

export const metadata: Metadata = { title: 'Primitives', robots: { index: false } };

/** Every primitive in every state, for those who build screens; not part of the product. */
export default function DesignPage() {
  if (process.env.NODE_ENV === 'production' && process.env.DESIGN_PAGE !== '1') notFound();
  return (
    <>
      <Masthead
        places={[{ name: 'Primitives' }]}
        people={[
          { initials: 'HO', name: 'Hanne Oduya', role: 'PI' },
          { initials: 'TQ', name: 'Tomas Quill', role: 'experimentalist', current: true },
        ]}
      />
      <main id="main" className="pb-12">
        <div className="px-edge pt-7.5 pb-5.5">
          <h1 className="text-title">Primitives</h1>
          <p className="mt-2 max-w-[70ch] text-lead text-ink-2">
            Every part that the screens are made of. Blue speaks for the calculation, copper for the
            measurement, plum for dissent; everything else is paper and ink.
          </p>
        </div>
        <Book>
          <MarksSections />
          <ControlsSections />
        </Book>
        <LedgerSections />
      </main>
    </>
  );
}
