/** The four simple disorders of acid and base. */
export type Disorder =
  | 'metabolic acidosis'
  | 'metabolic alkalosis'
  | 'respiratory acidosis'
  | 'respiratory alkalosis';
