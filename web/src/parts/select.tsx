/** A labelled choice. */
export function Select({
  label,
  value,
  options,
  onChange,
}: {
  readonly label: string;
  readonly value: string;
  readonly options: readonly { readonly value: string; readonly name: string }[];
  readonly onChange: (value: string) => void;
}) {
  return (
    <label>
      {label}
      <select value={value} onChange={(event) => onChange(event.target.value)}>
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.name}
          </option>
        ))}
      </select>
    </label>
  );
}

/** Case and sense of the load, kept in the address by whoever calls. */
export function CaseSense({
  cases,
  caseId,
  sense,
  onCase,
  onSense,
}: {
  readonly cases: readonly string[];
  readonly caseId: string;
  readonly sense: number;
  readonly onCase: (value: string) => void;
  readonly onSense: (value: string) => void;
}) {
  return (
    <>
      <Select
        label="Load case"
        value={caseId}
        options={cases.map((value) => ({ value, name: value }))}
        onChange={onCase}
      />
      <Select
        label="Sense"
        value={String(sense)}
        options={[
          { value: '1', name: '+ along the case' },
          { value: '-1', name: '\u2212 against it' },
        ]}
        onChange={onSense}
      />
    </>
  );
}
