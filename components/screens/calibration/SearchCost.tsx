import { Txt } from '@/components/ui/Txt';
import { searchSeconds } from './searchForm';

interface Props {
  /** Of the run itself, s. */
  seconds: number;
  coarser: number;
  runs: number;
}

/** What the search will take, from what the run took. */
export function SearchCost({ seconds, coarser, runs }: Props) {
  if (!Number.isFinite(runs) || runs <= 0) return null;
  const minutes = searchSeconds(seconds, coarser, runs) / 60;
  const time =
    minutes < 1.5
      ? 'a minute or so'
      : minutes < 90
        ? `about ${Math.round(minutes)} min`
        : `about ${Math.round(minutes / 60)} h`;
  return (
    <Txt variant="small" tone="soft">
      {`At most ${runs} runs, ${time} of computing. It goes on when you leave, and can be cancelled.`}
    </Txt>
  );
}
