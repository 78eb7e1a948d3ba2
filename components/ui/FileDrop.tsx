import { useRef, useState, type DragEvent } from 'react';
import { radius, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Button, type ButtonKind } from './Button';
import { Txt } from './Txt';

interface FileDropProps {
  /** On the button, e.g. "Choose the survey file". */
  label: string;
  /** Endings, e.g. `.xlsx,.csv`. */
  accept: string;
  hint?: string;
  kind?: ButtonKind;
  busy?: boolean;
  disabled?: boolean;
  onFile: (file: File) => void;
}

/** Choose a file, or drop it here. */
export function FileDrop({ label, accept, hint, kind, busy, disabled, onFile }: FileDropProps) {
  const { colours } = useTheme();
  const input = useRef<HTMLInputElement>(null);
  const [over, setOver] = useState(false);
  const off = Boolean(busy || disabled);

  const take = (files: FileList | null) => {
    if (files?.[0] && !off) onFile(files[0]);
  };
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setOver(false);
    take(event.dataTransfer.files);
  };
  return (
    <div
      onDragOver={(event) => {
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={() => setOver(false)}
      onDrop={drop}
      style={{
        border: `1px dashed ${over ? colours.ink : colours.edge}`,
        borderRadius: radius.card,
        background: over ? colours.earthTint : 'transparent',
        padding: space.two,
        display: 'flex',
        flexDirection: 'column',
        gap: space.one,
      }}
    >
      <input
        ref={input}
        type="file"
        accept={accept}
        aria-label={label}
        tabIndex={-1}
        disabled={off}
        onChange={(event) => {
          take(event.target.files);
          event.target.value = ''; // the same file, mended, may be chosen again
        }}
        style={{ display: 'none' }}
      />
      <Button
        label={label}
        kind={kind}
        wide
        busy={busy}
        disabled={disabled}
        onPress={() => input.current?.click()}
      />
      {hint ? (
        <Txt variant="small" tone="soft">
          {hint}
        </Txt>
      ) : null}
    </div>
  );
}
