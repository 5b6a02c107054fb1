import { ChangeDetectionStrategy, Component, inject, input, output } from '@angular/core';
import { DOCUMENT } from '@angular/common';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { Paper } from '../../../domain/documents/paper';
import type { PaperSize } from '../../../domain/estimate/terms';
import type { ApiProblem } from '../../core/api-client';
import { Failed } from '../../ui/failed';
import { Sweep } from '../../ui/sweep';
import { PaperView } from './paper-view';
import type { PaperFiles } from './papers-api';

/** A document as it is fetched. */
export type PaperState =
  | { readonly status: 'loading' }
  | { readonly status: 'failed'; readonly problem: ApiProblem }
  | { readonly status: 'ready'; readonly paper: Paper };

const SIZE_NAMES: Readonly<Record<PaperSize, string>> = { letter: 'Letter', a4: 'A4' };

/** A document's page: what can be done with it above, the document below. On paper only the document remains. */
@Component({
  selector: 'tw-paper-frame',
  imports: [Failed, MatButton, PaperView, RouterLink, Sweep],
  templateUrl: './paper-frame.html',
  styleUrl: './paper-frame.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PaperFrame {
  readonly state = input.required<PaperState>();
  readonly files = input.required<PaperFiles>();
  readonly back = input.required<{ readonly link: string; readonly text: string }>();
  readonly retry = output();

  private readonly window = inject(DOCUMENT).defaultView;

  protected readonly sizeName = (size: PaperSize) => SIZE_NAMES[size];

  protected print(): void {
    this.window?.print();
  }
}
