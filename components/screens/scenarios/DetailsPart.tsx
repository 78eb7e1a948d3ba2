import { StyleSheet, View } from 'react-native';
import { SelectField } from '@/components/ui/SelectField';
import { TextField } from '@/components/ui/TextField';
import { Button } from '@/components/ui/Button';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useReaches } from '@/components/queries/reaches';
import { LIMITS } from '@/shared/limits';
import { EditorPart, FieldRow } from './EditorPart';
import { useEditing } from './editorContext';
import { PlacedField } from './PlacedField';

/** Name, reach, clock and note. */
export function DetailsPart() {
  const { draft, dispatch, isLocked: disabled } = useEditing();
  const { study } = useCurrentStudy();
  const reaches = useReaches(study.id).data ?? [];
  const change = (to: Partial<Pick<typeof draft, 'name' | 'note' | 'startsAt' | 'reachId'>>) =>
    dispatch({ type: 'detailsChanged', change: to });
  return (
    <EditorPart part="details">
      <FieldRow>
        <PlacedField path="name" half>
          {(error) => (
            <TextField
              label="Name"
              maxLength={LIMITS.textShort}
              value={draft.name}
              onChange={(name) => change({ name })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
        <PlacedField path="reachId" half>
          {(error) => (
            <>
              <SelectField
                label="Reach"
                value={String(draft.reachId)}
                options={reaches.map(({ id, name }) => ({ value: String(id), label: name }))}
                onChange={(id) => change({ reachId: Number(id) })}
                {...{ error, disabled }}
              />
              {error ? (
                <Button kind="quiet" label="To the reach" href={`/studies/${study.id}/reach`} />
              ) : null}
            </>
          )}
        </PlacedField>
      </FieldRow>
      <View style={styles.clock}>
        <PlacedField path="startsAt">
          {(error) => (
            <TextField
              label="Clock time of the start"
              optional
              hint="Like 2026-11-14 06:00. Empty: times are told from the start alone."
              value={draft.startsAt}
              onChange={(startsAt) => change({ startsAt })}
              {...{ error, disabled }}
            />
          )}
        </PlacedField>
      </View>
      <PlacedField path="note">
        {(error) => (
          <TextField
            label="Note"
            optional
            lines={2}
            maxLength={LIMITS.textLong}
            hint="What it stands for, and where its numbers come from."
            value={draft.note}
            onChange={(note) => change({ note })}
            {...{ error, disabled }}
          />
        )}
      </PlacedField>
    </EditorPart>
  );
}

const styles = StyleSheet.create({ clock: { maxWidth: 440 } });
