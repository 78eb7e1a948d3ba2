import { StyleSheet, View } from 'react-native';
import { useForgetUpload, useUploads } from '@/components/queries/uploads';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { List } from '@/components/ui/List';
import { Txt } from '@/components/ui/Txt';
import { wallClock } from '@/components/ui/wallClock';
import { megabytes } from './megabytes';

/** Files that were begun and not handed in: what of them has arrived, until when it is kept. */
export function UnfinishedCard({ studyId }: { studyId: number }) {
  const uploads = useUploads(studyId);
  const forget = useForgetUpload(studyId);
  if (!uploads.data?.length) return null;
  return (
    <Card title="Not handed in yet" aside="kept for a day">
      <Txt tone="soft">Choose the same file again, and it goes on from where it stopped.</Txt>
      {forget.error ? <ErrorState title="The file was not forgotten" error={forget.error} /> : null}
      <List label="Not handed in yet">
        {uploads.data.map(({ id, fileName, received, size, expiresAt }) => (
          <View key={id} style={styles.line}>
            <View style={styles.words}>
              <Txt strong>{fileName}</Txt>
              <Txt variant="small" tone="soft">
                {received < size
                  ? `${megabytes(received)} of ${megabytes(size)} MB have arrived`
                  : 'Arrived whole, not handed in'}
                {`; kept until ${wallClock(expiresAt)}`}
              </Txt>
            </View>
            <Button
              kind="quiet"
              label="Forget"
              name={`Forget ${fileName}`}
              onPress={() => forget.mutate(id)}
            />
          </View>
        ))}
      </List>
    </Card>
  );
}

const styles = StyleSheet.create({
  line: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    alignItems: 'center',
    columnGap: space.two,
  },
  words: { flexShrink: 1, minWidth: 0 },
});
