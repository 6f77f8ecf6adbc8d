import { CONTROL } from '@/components/forms/field-frame';

type PickFilterProps = {
  name: string;
  label: string;
  value: string | undefined;
  all: string;
  rows: readonly { id: string; name: string }[];
};

export function PickFilter({ name, label, value, all, rows }: PickFilterProps) {
  return (
    <label className="min-w-0">
      <span className="block text-small font-semibold">{label}</span>
      <select key={value ?? ''} name={name} defaultValue={value ?? ''} className={`${CONTROL} sm:w-48`}>
        <option value="">{all}</option>
        {rows.map((row) => (
          <option key={row.id} value={row.id}>
            {row.name}
          </option>
        ))}
      </select>
    </label>
  );
}
