import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { LinkMark } from '@/components/marks/link-mark';
import { Masthead } from '@/components/masthead/masthead';

export const metadata: Metadata = { title: 'Primitives' };

export default function DesignPage() {
  if (process.env.NODE_ENV === 'production' && process.env.DESIGN_PAGE !== '1') notFound();
  return (
    <>
      <Masthead places={[{ name: 'Primitives' }]} />
      <main id="main" className="px-edge">
        <h1 className="text-title">Primitives ⟨S⟩ √ †</h1>
        <LinkMark kind="broken" />
      </main>
    </>
  );
}
