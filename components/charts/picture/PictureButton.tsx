import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { saveBlob } from '@/components/queries/saveBlob';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Txt } from '@/components/ui/Txt';
import { drawPng } from './drawPng';
import { withFonts } from './embeddedFonts';
import type { PictureSource } from './pictureContext';
import { legendOf } from './placeLegend';
import { pictureName, pictureTitle } from './pictureName';
import { pictureSvg } from './pictureSvg';

interface Props {
  label: string;
  unit?: string;
  source: PictureSource;
  /** What holds the drawing and its legend on the page. */
  box: () => Element | null;
}

/** Takes a drawing away as a picture, for a letter or a slide. */
export function PictureButton({ label, unit, source, box }: Props) {
  const [isOpen, setIsOpen] = useState(false);
  const [failure, setFailure] = useState<string | null>(null);
  const title = pictureTitle(label);
  const save = async (kind: 'png' | 'svg') => {
    const found = box();
    const drawing = found?.querySelector('svg');
    if (!found || !drawing) return;
    setFailure(null);
    try {
      const drawn = pictureSvg(drawing, {
        title,
        unit,
        label,
        source,
        legend: legendOf(found.querySelector('[role="list"]')),
      });
      const picture = await withFonts(drawn);
      const blob =
        kind === 'png'
          ? await drawPng(picture)
          : new Blob([picture.svg], { type: 'image/svg+xml;charset=utf-8' });
      saveBlob(blob, `${pictureName(title, source)}.${kind}`);
      setIsOpen(false);
    } catch (error) {
      setFailure(error instanceof Error ? error.message : 'The picture could not be made.');
    }
  };
  return (
    <View style={styles.row}>
      {isOpen ? (
        <>
          <Button
            kind="quiet"
            label="PNG"
            name={`PNG of ${title}`}
            onPress={() => void save('png')}
          />
          <Button
            kind="quiet"
            label="SVG"
            name={`SVG of ${title}`}
            onPress={() => void save('svg')}
          />
        </>
      ) : (
        <Button
          kind="quiet"
          label="Picture"
          name={`Picture of ${title}`}
          onPress={() => setIsOpen(true)}
        />
      )}
      {failure ? (
        <Txt role="alert" variant="small" tone="brick">
          {failure}
        </Txt>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'flex-end', columnGap: space.two },
});
