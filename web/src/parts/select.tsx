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

const SENSES = [
  { value: 1, sign: '+', name: 'along the case' },
  { value: -1, sign: '\u2212', name: 'against the case' },
] as const;

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
      <div className="field" role="group" aria-label="Sense">
        <span>Sense</span>
        <div className="switch">
          {SENSES.map(({ value, sign, name }) => (
            <button
              key={value}
              type="button"
              aria-pressed={sense === value}
              aria-label={`${sign} ${name}`}
              title={name}
              onClick={() => onSense(String(value))}
            >
              {sign}
            </button>
          ))}
        </div>
      </div>
    </>
  );
}
