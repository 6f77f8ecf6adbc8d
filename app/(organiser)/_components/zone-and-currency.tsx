import { SelectField } from '@/components/forms/select-field';
import { listCampCurrencies } from '@/lib/domain/camp/camp-currency';
import { listTimeZones } from '@/lib/domain/camp/time-zones';

type ZoneFieldProps = { /** Kept in the list though the list knows it by another name. */ current?: string };

export function ZoneField({ current }: ZoneFieldProps) {
  const zones = listTimeZones();
  const names = current && !zones.includes(current) ? [current, ...zones] : zones;
  return (
    <SelectField
      name="timeZone"
      label="Time zone of the venue"
      hint="Every time of the camp is read on a clock there."
      blank="Choose"
      choices={names.map((zone) => ({ value: zone, label: zone.replaceAll('_', ' ') }))}
    />
  );
}

export function CurrencyField({ fixed = false }: { fixed?: boolean }) {
  return (
    <SelectField
      name="currency"
      label="Currency"
      hint={fixed ? 'Fixed: there are orders in it.' : 'All prices of the camp; fixed with the first order.'}
      blank="Choose"
      choices={listCampCurrencies().map(({ code, name }) => ({ value: code, label: `${code} · ${name}` }))}
    />
  );
}
