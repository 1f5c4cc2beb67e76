/** While a page is read: the ruled page, quiet, with the word for it. */
export default function Loading() {
  return (
    <div role="status" className="mx-auto max-w-page px-4 py-10 sm:px-8">
      <p className="font-head text-xl text-ink-soft">Reading the log…</p>
      <div aria-hidden="true" className="mt-6 grid gap-8">
        {[0, 1, 2, 3, 4].map((line) => (
          <div key={line} className="border-b border-rule" />
        ))}
      </div>
    </div>
  );
}
