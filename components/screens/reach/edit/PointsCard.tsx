import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { insertPoint } from '@/shared/reaches/edit/insertPoint';
import { movePoint } from '@/shared/reaches/edit/movePoint';
import { withPoints } from '@/shared/reaches/edit/withPoints';
import { formatWithUnit } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { AllPointsDialog } from './AllPointsDialog';
import { useEditing } from './editorContext';
import { pastedPoints } from './pastedPoints';
import { PointsTable } from './PointsTable';
import { SectionDrawing } from './SectionDrawing';
import { channelWindow, scaledWindow, wholeWindow, windowShowing } from './sectionWindow';
import type { Window } from './editDrawingModel';

/** The ground of the section: drawn upon and in figures. */
export function PointsCard() {
  const { section, surveyed, put, editor, faultAt } = useEditing();
  const system = useUnitSystem();
  const [wanted, setChosen] = useState(0);
  const [near, setNear] = useState<Window | null>(null);
  const [pasteFaults, setPasteFaults] = useState<string[]>([]);
  const [isPasting, setIsPasting] = useState(false);
  const { points } = section;
  const chosen = Math.min(wanted, points.length - 1);
  const whole = wholeWindow(section);
  const channel = channelWindow(section);
  const [offset, elevation] = points[chosen];
  const window = near ?? whole;

  const faulty = useMemo(
    () =>
      new Set(
        editor.faults.flatMap(({ sectionId, path }) => {
          const row = sectionId === section.id && /^points\[(\d+)\]/.exec(path)?.[1];
          return row ? [Number(row)] : [];
        }),
      ),
    [editor.faults, section.id],
  );
  const choose = (index: number) => {
    setChosen(index);
    if (near && points[index]) setNear(windowShowing(section, near, points[index][0]));
  };
  const paste = (row: number, column: 0 | 1, text: string) => {
    const pasted = pastedPoints(section, row, column, text, system);
    setPasteFaults(pasted.faults);
    if (!pasted.section) return;
    editor.unread.clear();
    put(pasted.section, `${pasted.rows} rows pasted from point ${row + 1}`);
  };
  const removePoint = () => {
    editor.unread.clear();
    put(
      withPoints(
        section,
        points.filter((_, i) => i !== chosen),
      ),
      `point ${chosen + 1} taken out`,
    );
  };
  const addPoint = () => {
    editor.unread.clear();
    put(insertPoint(section, chosen), `point added after ${chosen + 1}`);
    setChosen(chosen + 1);
  };
  const listFault = faultAt('points');
  return (
    <Card
      title={`Ground of ${section.id}`}
      aside={`${formatWithUnit(section.chainage, 'chainage', system)} · ${points.length} points`}
    >
      <SectionDrawing
        {...{ section, surveyed, window, chosen, faulty }}
        onChoose={choose}
        onMove={(index, to, gesture) =>
          put(movePoint(section, index, to), `point ${index + 1} moved`, gesture)
        }
      />
      <Txt variant="small" tone="soft">
        Elevation in {UNITS[system].elevation.symbol} above datum, offset in{' '}
        {UNITS[system].length.symbol}, looking downstream.
        {surveyed ? ' Dashed: as surveyed.' : ''}
      </Txt>
      <View style={styles.buttons}>
        <Button kind="quiet" label="Whole section" disabled={!near} onPress={() => setNear(null)} />
        {channel ? <Button kind="quiet" label="Channel" onPress={() => setNear(channel)} /> : null}
        <Button
          kind="quiet"
          label="Closer"
          onPress={() => setNear(scaledWindow(section, window, offset, 0.5))}
        />
        <Button
          kind="quiet"
          label="Farther"
          disabled={!near}
          onPress={() => setNear(scaledWindow(section, window, offset, 2))}
        />
      </View>
      <Txt>
        Point {chosen + 1} of {points.length}: offset {formatWithUnit(offset, 'length', system)},
        elevation {formatWithUnit(elevation, 'elevation', system)}.
      </Txt>
      <Txt variant="small" tone="soft">
        Drag it, or stand on the drawing and use the arrow keys; with Shift ten times as far. Page
        Up and Page Down go from point to point.
      </Txt>
      <View style={styles.buttons}>
        <Button label="Add a point after it" onPress={addPoint} />
        <Button label="Take the point out" onPress={removePoint} />
        <Button label="All points as text" onPress={() => setIsPasting(true)} />
      </View>
      {listFault ? (
        <Txt role="alert" tone="brick" strong>
          {listFault}
        </Txt>
      ) : null}
      {pasteFaults.length > 0 ? (
        <Notice tone="danger" title="Not pasted: the points stay as they were">
          {pasteFaults.slice(0, 5).map((message) => (
            <Txt key={message}>{message}</Txt>
          ))}
        </Notice>
      ) : null}
      <PointsTable chosen={chosen} onChoose={choose} onPaste={paste} />
      {isPasting ? <AllPointsDialog onClose={() => setIsPasting(false)} /> : null}
    </Card>
  );
}

const styles = StyleSheet.create({
  buttons: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.two, rowGap: space.one },
});
