import type { Href } from 'expo-router';
import type { Me } from '@/shared/accounts/types';
import type { Study } from '@/shared/studies/types';

/** A place of the rail, and of the row below on a phone. */
export interface Place {
  label: string;
  href: Href;
  /** The address that it and the screens under it begin with. */
  path: string;
  /** Count or state on its right. */
  aside?: string;
  /** Only itself, not what lies under it. */
  exact?: boolean;
}

/** Whose daily work the studies are: everybody's but that of an administrator alone. */
export const hasStudies = (me: Me): boolean => me.roles.some((role) => role !== 'administrator');

/** Whose signature runs wait for. */
export const checksRuns = (me: Me): boolean => me.roles.includes('seniorEngineer');

/** Who computes floods, and answers for them. */
export const isEngineer = (me: Me): boolean =>
  me.roles.includes('modeller') || me.roles.includes('seniorEngineer');

/** Places outside a study; `waiting` is how many runs wait for a check. */
export function housePlaces(me: Me, waiting?: number): Place[] {
  const places: Place[] = [];
  if (hasStudies(me)) places.push({ label: 'Studies', href: '/', path: '/', exact: true });
  if (checksRuns(me))
    places.push({ label: 'To check', href: '/queue', path: '/queue', aside: some(waiting) });
  if (isEngineer(me)) places.push({ label: 'Proof', href: '/proof', path: '/proof' });
  if (me.roles.includes('administrator'))
    places.push(
      { label: 'People', href: '/people', path: '/people' },
      { label: 'Audit', href: '/audit', path: '/audit' },
    );
  places.push({ label: 'Profile', href: '/profile', path: '/profile' });
  return places;
}

const some = (count: number | null | undefined): string | undefined =>
  count ? String(count) : undefined;

/** The path of a study, as far as the person may walk it. */
export function studyPlaces(study: Study): Place[] {
  const root = `/studies/${study.id}` as const;
  const may = (action: (typeof study.may)[number]) => study.may.includes(action);
  const { counts } = study;
  const places: (Place | false)[] = [
    { label: 'Study', href: root, path: root, exact: true },
    (may('survey.read') || may('survey.send')) && {
      label: 'Survey',
      href: `${root}/survey`,
      path: `${root}/survey`,
      aside: counts?.surveyRevision ? `rev ${counts.surveyRevision}` : undefined,
    },
    may('reach.read') && {
      label: 'Reach',
      href: `${root}/reach`,
      path: `${root}/reach`,
      aside: some(counts?.sections),
    },
    may('reach.read') && { label: 'Stations', href: `${root}/stations`, path: `${root}/stations` },
    may('scenario.read') && {
      label: 'Scenarios',
      href: `${root}/scenarios`,
      path: `${root}/scenarios`,
      aside: some(counts?.scenarios),
    },
    may('run.read') && {
      label: 'Runs',
      href: `${root}/runs`,
      path: `${root}/runs`,
      aside: some(counts?.runs),
    },
    may('run.read') && {
      label: 'Confidence',
      href: `${root}/confidence`,
      path: `${root}/confidence`,
    },
    may('run.read') && {
      label: 'Calibration',
      href: `${root}/calibration`,
      path: `${root}/calibration`,
    },
  ];
  return places.filter((place): place is Place => place !== false);
}

export const isAt = (place: Place, pathname: string): boolean =>
  pathname === place.path || (!place.exact && pathname.startsWith(`${place.path}/`));

/** What fits below on a phone: at most five, the last of them "More". */
export function splitForPhone(places: Place[]): { shown: Place[]; more: Place[] } {
  if (places.length <= 5) return { shown: places, more: [] };
  const daily = ['Survey', 'Reach', 'Scenarios', 'Runs'].flatMap((label) =>
    places.filter((place) => place.label === label),
  );
  // Outside a study none of them is there.
  const shown = daily.length > 0 ? daily : places.slice(0, 4);
  return { shown, more: places.filter((place) => !shown.includes(place)) };
}
