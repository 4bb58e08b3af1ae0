import { Select } from '@/features/ui/select';

import { deviceTimeZone } from './form';

/** Every time zone the browser knows; the device's own first. */
function timeZones(): string[] {
  const own = deviceTimeZone();
  return [own, ...Intl.supportedValuesOf('timeZone').filter((zone) => zone !== own)];
}

const words = (zone: string) => zone.replaceAll('_', ' ').replaceAll('/', ', ');

interface TimeZoneSelectProps {
  value: string;
  onChange: (zone: string) => void;
  error?: string;
}

/** A shop's day, for expiry dates and daily trial runs, begins at midnight of its own time zone. */
export function TimeZoneSelect({ value, onChange, error }: TimeZoneSelectProps) {
  return (
    <Select
      name="timeZone"
      label="Time zone"
      options={timeZones().map((zone) => ({ value: zone, label: words(zone) }))}
      value={value}
      onChange={onChange}
      error={error}
    />
  );
}
