import { SkeletonRows } from '@/components/ui/skeleton-rows';

/** Only here: under a loading page the status of a forbidden or missing page can no longer tell the truth. */
export default function Loading() {
  return (
    <main id="main" className="px-edge py-14" aria-busy="true">
      <p className="mb-4 text-ink-2">Opening the runs …</p>
      <SkeletonRows rows={8} />
    </main>
  );
}
