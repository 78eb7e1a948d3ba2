import { useGlobalSearchParams, usePathname } from 'expo-router';
import { useMe } from '../queries/SessionProvider';
import { useStudy } from '../queries/studies';
import { useCheckQueue } from '../queries/reviews';
import { checksRuns, housePlaces, studyPlaces, type Place } from './places';

/** Where the person can go from here. */
export function usePlaces(): { house: Place[]; study: Place[]; pathname: string } {
  const me = useMe();
  const pathname = usePathname();
  const { studyId } = useGlobalSearchParams<{ studyId?: string }>();
  const id = pathname.startsWith('/studies/') ? Number(studyId) : NaN;
  const { data } = useStudy(Number.isInteger(id) ? id : null);
  const queue = useCheckQueue(checksRuns(me));
  return {
    house: housePlaces(me, queue.data?.length),
    study: data ? studyPlaces(data) : [],
    pathname,
  };
}
