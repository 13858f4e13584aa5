import { SkeletonRows } from '@/components/ui/skeleton-rows';

export default function Loading() {
  return (
    <main id="main" className="px-edge py-14" aria-busy="true">
      <p className="mb-4 text-ink-2">Opening …</p>
      <SkeletonRows />
    </main>
  );
}
