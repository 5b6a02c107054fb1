/** Which kinds of line bear sales tax; by state setting. Outside work counts with labour. */
export const TAX_TREATMENTS = ['none', 'parts', 'labour', 'both'] as const;
export type TaxTreatment = (typeof TAX_TREATMENTS)[number];

export const TAX_TREATMENT_LABELS: Readonly<Record<TaxTreatment, string>> = {
  none: 'Nothing is taxed',
  parts: 'Parts are taxed',
  labour: 'Labour and outside work are taxed',
  both: 'Parts, labour and outside work are taxed',
};

export const LINE_KINDS = ['labour', 'part', 'outside'] as const;
export type LineKind = (typeof LINE_KINDS)[number];

export const LINE_KIND_LABELS: Readonly<Record<LineKind, string>> = {
  labour: 'Labour',
  part: 'Part',
  outside: 'Outside work',
};

/** The order in which a job is done (common practice in the trade, no source). */
export const STAGES = ['intake', 'power', 'signal', 'speaker', 'mechanism', 'test', 'cabinet', 'return'] as const;
export type Stage = (typeof STAGES)[number];

export const STAGE_LABELS: Readonly<Record<Stage, string>> = {
  intake: 'Intake and safety',
  power: 'Power supply',
  signal: 'Signal chain',
  speaker: 'Speaker and dial',
  mechanism: 'Motor and mechanism',
  test: 'Alignment and test',
  cabinet: 'Cabinet and finish',
  return: 'Packing and return',
};

export const PAPER_SIZES = ['letter', 'a4'] as const;
export type PaperSize = (typeof PAPER_SIZES)[number];
