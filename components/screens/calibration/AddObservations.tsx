import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import { AddMarksDialog } from './AddMarksDialog';
import { GaugeDialog } from './GaugeDialog';

interface Props {
  floods: readonly string[];
  /** Chosen place, m. */
  at: number | null;
}

/** The two things that can be added. */
export function AddObservations({ floods, at }: Props) {
  const [adding, setAdding] = useState<'marks' | 'gauge' | null>(null);
  const close = () => setAdding(null);
  return (
    <>
      <Button label="Add a gauge record" onPress={() => setAdding('gauge')} />
      <Button label="Add marks" kind="solid" onPress={() => setAdding('marks')} />
      {adding === 'marks' ? <AddMarksDialog floods={floods} onClose={close} /> : null}
      {adding === 'gauge' ? (
        <GaugeDialog gauge={null} floods={floods} at={at} onClose={close} />
      ) : null}
    </>
  );
}
