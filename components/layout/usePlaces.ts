import { useGlobalSearchParams, usePathname } from 'expo-router';
import { useMe } from '../queries/SessionProvider';
import { useStudy } from '../queries/studies';
import { housePlaces, studyPlaces, type Place } from './places';

/** Where the person can go from here. */
export function usePlaces(): { house: Place[]; study: Place[]; pathname: string } {
  const me = useMe();
  const pathname = usePathname();
  const { studyId } = useGlobalSearchParams<{ studyId?: string }>();
  const id = pathname.startsWith('/studies/') ? Number(studyId) : NaN;
  const { data } = useStudy(Number.isInteger(id) ? id : null);
  return { house: housePlaces(me), study: data ? studyPlaces(data) : [], pathname };
}
