/** Identifier in the document of a point of the discussion. */
export const pointAnchor = (id: number): string => `point-${id}`;

/** Brings a point into view and the keyboard to it. */
export function jumpToPoint(id: number): void {
  const place = document.getElementById(pointAnchor(id));
  place?.scrollIntoView({ block: 'center' });
  place?.focus({ preventScroll: true });
}
