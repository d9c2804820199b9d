/** One underlined choice of a filter sentence; its label is heard, not seen. */
export function Choice({
  name,
  label,
  value,
  options,
}: {
  name: string;
  label: string;
  value: string;
  options: readonly (readonly [value: string, words: string])[];
}) {
  return (
    <select key={value} name={name} aria-label={label} defaultValue={value}>
      {options.map(([each, words]) => (
        <option key={each} value={each}>
          {words}
        </option>
      ))}
    </select>
  );
}
