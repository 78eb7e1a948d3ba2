import { useRef } from 'react';
import { Button, type ButtonKind } from '@/components/ui/Button';
import { SURVEY_ENDINGS } from './HandInCard';

interface FileButtonProps {
  label: string;
  kind?: ButtonKind;
  onFile: (file: File) => void;
}

/** A button that opens the choice of a survey file. */
export function FileButton({ label, kind, onFile }: FileButtonProps) {
  const input = useRef<HTMLInputElement>(null);
  return (
    <>
      <input
        ref={input}
        type="file"
        hidden
        accept={SURVEY_ENDINGS}
        aria-label={`${label}, file`}
        onChange={(event) => {
          const file = event.target.files?.[0];
          event.target.value = ''; // the same name again is the mended file
          if (file) onFile(file);
        }}
      />
      <Button label={label} kind={kind} wide onPress={() => input.current?.click()} />
    </>
  );
}
