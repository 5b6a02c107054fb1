import { Injectable } from '@angular/core';
import type { LineKind } from '../../../domain/estimate/terms';
import type { TypedLine } from './line-form';

/** Typing that the server has not taken yet: of a line, or of one still to be added. */
export interface LineDraft {
  /** Null for a line still to be added. */
  readonly lineId: number | null;
  readonly kind: LineKind;
  readonly typed: TypedLine;
  /** The version of the line that the typing began from; 0 for one still to be added. */
  readonly version: number;
}

const keyOf = (estimateId: number) => `thenworth.line-draft.${estimateId}`;

/**
 * Keeps what is typed on this machine with every keystroke, so that neither a lost connection nor a closed window
 * loses it. One line is open at a time, so one draft an estimate is enough.
 */
@Injectable({ providedIn: 'root' })
export class LineDrafts {
  read(estimateId: number): LineDraft | null {
    const text = localStorage.getItem(keyOf(estimateId));
    return text === null ? null : (JSON.parse(text) as LineDraft);
  }

  keep(estimateId: number, draft: LineDraft): void {
    localStorage.setItem(keyOf(estimateId), JSON.stringify(draft));
  }

  forget(estimateId: number): void {
    localStorage.removeItem(keyOf(estimateId));
  }
}
