'use client';

import { useId } from 'react';
import { inputClass } from './input-class';

/** One of a few, as the browser's own list. */
export function ChoiceField<Value extends string>({
  label,
  choices,
  value,
  onChange,
}: {
  label: string;
  choices: readonly { readonly value: Value; readonly label: string }[];
  value: Value;
  onChange: (value: Value) => void;
}) {
  const id = useId();
  return (
    <div>
      <label htmlFor={id} className="block font-semibold">
        {label}
      </label>
      <select
        id={id}
        value={value}
        className={`mt-1 ${inputClass(false)}`}
        onChange={({ target }) => {
          const chosen = choices.find((choice) => choice.value === target.value);
          if (chosen !== undefined) onChange(chosen.value);
        }}
      >
        {choices.map((choice) => (
          <option key={choice.value} value={choice.value}>
            {choice.label}
          </option>
        ))}
      </select>
    </div>
  );
}
