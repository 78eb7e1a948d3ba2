/**
 * Velocity (m/s) to report from the volume flux (m³/s) that the scheme moves past a place and from the flow of the cell
 * there, over the area (m²). They agree but in the cell of a hydraulic jump, where the cell's flow overshoots, and in
 * the cell of a front, where the flux belongs to the deeper water behind: the slower of both is right in either.
 */
export function waterVelocity(flux: number, cellFlow: number, area: number): number {
  return (Math.abs(flux) < Math.abs(cellFlow) ? flux : cellFlow) / area;
}
