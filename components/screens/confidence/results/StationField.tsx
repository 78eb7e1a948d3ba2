import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { NamedPlace } from '@/shared/confidence/types';
import { formatWithUnit } from '@/shared/units/format';

interface Props {
  stations: readonly NamedPlace[];
  /** Index of the chosen one. */
  chosen: number;
  onChange: (index: number) => void;
}

/** Which station is told; one alone is only named. */
export function StationField({ stations, chosen, onChange }: Props) {
  const system = useUnitSystem();
  const words = ({ name, chainage }: NamedPlace) =>
    `${name}, ${formatWithUnit(chainage, 'chainage', system)}`;
  if (stations.length === 1) return <Txt strong>{words(stations[0])}</Txt>;
  return (
    <SelectField
      label="Station"
      value={String(chosen)}
      options={stations.map((station, k) => ({ value: String(k), label: words(station) }))}
      onChange={(k) => onChange(Number(k))}
    />
  );
}
