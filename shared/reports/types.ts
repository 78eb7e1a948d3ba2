export const PAPERS = ['A4', 'LETTER'] as const;
export type Paper = (typeof PAPERS)[number];

/** `GET /api/runs/:runId/reports`. The PDF itself: `GET /api/runs/:runId/report.pdf?paper=A4&annex=false`. */
export interface ReportRow {
  id: number;
  paper: Paper;
  /** With the published cases as its last pages. */
  annex: boolean;
  standing: 'preliminary' | 'signed' | 'withdrawn';
  /** SHA-256 of the bytes, hex. */
  hash: string;
  bytes: number;
  pages: number;
  createdAt: string;
}
