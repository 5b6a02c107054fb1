import type { RestatementReply } from '../../../contracts/restatements';
import { formatPeriod, type Period } from '../../../domain/calendar/period';
import { formatMoney } from '../../../domain/money/money';
import { ApiProblem } from '../../core/api-client';

export type PricePreview = RestatementReply | ApiProblem | null;

/** A line under the price while it is typed. */
export function previewText(preview: PricePreview): string {
  if (preview === null) return '';
  if (preview instanceof ApiProblem)
    return preview.code === 'unreachable' ? '' : `Today’s money: not known. ${preview.message}`;
  const { restated, to, release } = preview;
  const amount = formatMoney(restated.amount, restated.currency, { whole: true });
  return `That is ${amount} in the money of ${formatPeriod(to.period as Period)}, release ${release}. It is not what the set is worth.`;
}
