import { NumberField, type NumberFieldProps } from '@/components/ui/NumberField';
import { useEditing } from '../editorContext';
import { PlacedField } from '../PlacedField';

type Props = Omit<NumberFieldProps, 'error' | 'disabled'> & {
  /** Path in the body, e.g. `structures[0].sill`. */
  path: string;
};

/** One number of a structure, half a row wide, at its place. */
export function StructureNumber({ path, ...field }: Props) {
  const { isLocked } = useEditing();
  return (
    <PlacedField path={path} half>
      {(error) => <NumberField {...field} error={error} disabled={isLocked} />}
    </PlacedField>
  );
}
