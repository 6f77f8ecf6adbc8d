import { CONTROL } from '@/components/forms/field-frame';

type FilterSelectProps = {
  name: string;
  label: string;
  value: string;
  onPick: (value: string) => void;
  choices: readonly { value: string; label: string }[];
};

/** One filter; empty is all. */
export function FilterSelect({ name, label, value, onPick, choices }: FilterSelectProps) {
  return (
    <label className="min-w-0">
      <span className="block text-small font-semibold">{label}</span>
      <select name={name} value={value} onChange={(event) => onPick(event.target.value)} className={CONTROL}>
        <option value="">All</option>
        {choices.map((choice) => (
          <option key={choice.value} value={choice.value}>
            {choice.label}
          </option>
        ))}
      </select>
    </label>
  );
}
