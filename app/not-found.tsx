import Link from 'next/link';

export default function NotFound() {
  return (
    <main id="main" className="px-edge py-14">
      <h1 className="text-title">There is no such page</h1>
      <p className="mt-3 max-w-[60ch] text-ink-2">
        Nothing your group has stands at this address. It may have been mistyped, or it belongs to another
        group.
      </p>
      <p className="mt-4">
        <Link href="/">To the studies of your group</Link>
      </p>
    </main>
  );
}
