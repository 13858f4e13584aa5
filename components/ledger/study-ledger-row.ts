import type { LinkMarkKind } from '@/components/marks/link-mark';
import type { MeasuredMoment } from '@/components/marks/moment-axis';

/** One complex of the study ledger: plain values, ready to print. Null is a value that nobody has. */
export interface StudyLedgerRow {
  id: string;
  href: string;
  /** As `Formula` takes it: "[CuCl4]2-". */
  formula: string;
  /** "Cu(II)"; null when the oxidation state is not stated. */
  metalWords: string | null;
  dCount: number | null;
  favoured: {
    /** IUPAC polyhedral symbol. */
    geometry: string;
    flattened?: boolean;
    multiplicity: number;
    /** Under the name in place of the configuration: "flattened". */
    note?: string;
  } | null;
  next: {
    gapKJPerMol: number | null;
    /** "quartet T-4", "one candidate". */
    words: string;
    /** † with the note it points to. */
    flag?: { href: string; words: string };
  };
  meanDistanceAngstrom: number | null;
  /** Where the distance can be traced to. */
  distanceHref?: string;
  shape: { index: 'tau4' | 'tau5' | 'S(OC-6)'; value: number } | null;
  /** Handbook band of the favoured candidate, μB. */
  handbook: { low: number; high: number } | null;
  mark: LinkMarkKind;
  markSentence?: string;
  moment: MeasuredMoment | null;
  /** In place of a moment: "not measured". */
  unmeasuredWord?: string;
  unpaired: { count: number; expandedU: number } | null;
  technique: string | null;
  /** "2 samples · 6 fillings" */
  samplesWords?: string;
  assignment: {
    state: 'signed' | 'proposed' | 'contested' | 'open';
    /** Who and when, or why not: "TQ, 20 Nov", "no proposal". */
    words: string;
    /** The PI's signature, when signed. */
    signedBy?: string;
  };
}

/** Rows under one family name. */
export interface StudyLedgerGroup {
  id: string;
  title: string;
  note?: string;
  /** "4 joined · 1 broken" */
  tally?: string;
  rows: readonly StudyLedgerRow[];
}

export type StudyLedgerSortKey =
  | 'complex'
  | 'candidate'
  | 'gap'
  | 'distance'
  | 'shape'
  | 'moment'
  | 'unpaired';
