import Link from 'next/link';
import { paths } from '@/lib/paths';

export default function NotFound() {
  return (
    <main className="mx-auto max-w-prose px-4 py-16">
      <h1 className="text-3xl">There is no such page in this log</h1>
      <p className="mt-3">
        The address may be mistyped, or it belongs to works you do not have access to.
      </p>
      <p className="mt-6">
        <Link href={paths.home}>Back to the first page</Link>
      </p>
    </main>
  );
}
