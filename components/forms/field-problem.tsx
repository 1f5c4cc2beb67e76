/** The sentence at a field: what is wrong and what would be right. */
export function FieldProblem({ id, children }: { id?: string; children?: string }) {
  if (children === undefined) return null;
  return (
    <p id={id} className="mt-1 text-sm font-semibold text-rust">
      <span aria-hidden="true">✕ </span>
      {children}
    </p>
  );
}
