/** Stations that have drawings of their own in a report; the tables tell all of them. */
export const DRAWN_STATIONS = 4;
