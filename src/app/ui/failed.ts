import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { BareScale } from './bare-scale';

/** Something did not load: what, what still works, and trying again. */
@Component({
  selector: 'tw-failed',
  imports: [BareScale, MatButton],
  template: `
    <tw-bare-scale state="gap" />
    <h2>{{ title() }}</h2>
    <p>{{ problem()?.message ?? text() }}</p>
    <button matButton="outlined" type="button" (click)="retry.emit()">Try again</button>
  `,
  styleUrl: './state.scss',
  host: { role: 'alert' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Failed {
  readonly title = input('This did not load');
  readonly text = input('');
  /** An error whose message is fit to show; it takes the place of `text`. */
  readonly problem = input<{ readonly message: string } | null>(null);
  readonly retry = output();
}
