import { View } from 'react-native';
import { errorWords } from './errorWords';
import { Button } from './Button';
import { Notice } from './Notice';
import { Txt } from './Txt';

interface ErrorStateProps {
  error: unknown;
  /** What could not be done, e.g. "The reach could not be read". */
  title?: string;
  retry?: () => void;
}

/** What happened, what it means for the work, what to do next. */
export function ErrorState({ error, title, retry }: ErrorStateProps) {
  const { message, reference } = errorWords(error);
  return (
    <Notice tone="danger" title={title ?? 'This could not be done'}>
      <Txt>{message}</Txt>
      {reference ? (
        <Txt variant="small" tone="soft">
          Reference {reference}
        </Txt>
      ) : null}
      {retry ? (
        <View>
          <Button label="Try again" onPress={retry} />
        </View>
      ) : null}
    </Notice>
  );
}
