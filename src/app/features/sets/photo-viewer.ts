import { A11yModule } from '@angular/cdk/a11y';
import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import type { Photo } from '../../../contracts/sets';

/** One photograph over the whole window; arrow keys go on, Escape goes back. Presentational. */
@Component({
  selector: 'tw-photo-viewer',
  imports: [A11yModule, MatIcon, MatIconButton],
  templateUrl: './photo-viewer.html',
  styleUrl: './photo-viewer.scss',
  host: {
    '(document:keydown.escape)': 'closed.emit()',
    '(document:keydown.arrowLeft)': 'go(-1)',
    '(document:keydown.arrowRight)': 'go(1)',
  },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PhotoViewer {
  readonly photos = input.required<readonly Photo[]>();
  readonly shown = input.required<Photo>();

  readonly shownChange = output<Photo>();
  readonly closed = output();

  protected readonly at = computed(() => this.photos().indexOf(this.shown()));
  protected readonly name = computed(() => this.shown().caption || `Photograph ${this.at() + 1}`);

  protected go(step: -1 | 1): void {
    const next = this.photos()[this.at() + step];
    if (next) this.shownChange.emit(next);
  }
}
