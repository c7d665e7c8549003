/** What homes with an air-to-water heat pump have shown over a year. */
export interface FieldStudy {
  readonly place: string;
  /** Seasonal factor: heat out over electricity in. */
  readonly factor: number;
  /** Which homes, and which figure of them. */
  readonly what: string;
  readonly source: string;
}

/**
 * Seasonal factors measured in homes, to be set beside a computed one: ranges to think with, not targets. A computed year
 * knows nothing of settings, balancing and sensors; `heatPump.inUseAllowance` takes an allowance for them.
 *
 * Reference: each entry's own.
 */
export const fieldStudies: readonly FieldStudy[] = [
  {
    place: 'United Kingdom',
    factor: 2.8,
    what: 'field trial of homes, median of the interim report',
    source: 'as quoted in a secondary text',
  },
  {
    place: 'United Kingdom',
    factor: 2.93,
    what: 'field trial of homes, average of the final report',
    source: 'as quoted in a secondary text',
  },
  { place: 'Germany', factor: 2.8, what: 'new buildings', source: 'read in the report of the field study' },
];
