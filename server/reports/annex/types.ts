import type {
  VerificationCase,
  VerificationResult,
  VerificationSummary,
} from '../../../shared/verificationCases/types';

export interface AnnexCase {
  about: VerificationCase;
  result: VerificationResult;
  summary: VerificationSummary;
}

/** What the annex of published cases is made of: plain data, it travels to a worker thread. */
export interface AnnexFacts {
  firmName: string;
  /** One at least, in the order of the list. */
  cases: AnnexCase[];
}
