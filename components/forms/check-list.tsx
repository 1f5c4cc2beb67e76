'use client';

/** Boxes of 44 px under one question. */
export function CheckList({
  legend,
  choices,
  chosen,
  onChange,
  problem,
}: {
  legend: string;
  choices: readonly { readonly value: string; readonly label: string; readonly hint?: string }[];
  chosen: readonly string[];
  onChange: (chosen: readonly string[]) => void;
  problem?: string;
}) {
  return (
    <fieldset>
      <legend className="font-semibold">{legend}</legend>
      {problem === undefined ? null : <p className="font-semibold text-rust">{problem}</p>}
      <div className="mt-1 flex flex-wrap gap-x-6">
        {choices.map(({ value, label, hint }) => (
          <label key={value} className="flex min-h-touch items-center gap-2">
            <input
              type="checkbox"
              className="size-5 accent-verdigris"
              checked={chosen.includes(value)}
              onChange={({ target }) =>
                onChange(
                  target.checked ? [...chosen, value] : chosen.filter((each) => each !== value),
                )
              }
            />
            <span>
              {label}
              {hint === undefined ? null : (
                <span className="block text-sm text-ink-soft">{hint}</span>
              )}
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
