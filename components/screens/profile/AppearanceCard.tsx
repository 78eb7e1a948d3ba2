import { useTheme } from '@/components/theme/useTheme';
import { Card } from '@/components/ui/Card';
import { RadioGroup } from '@/components/ui/RadioGroup';

const CHOICES = [
  { value: 'system', label: 'As the device' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
] as const;

export function AppearanceCard() {
  const { choice, setChoice } = useTheme();
  return (
    <Card title="Light and dark">
      <RadioGroup label="On this device" value={choice} options={CHOICES} onChange={setChoice} />
    </Card>
  );
}
