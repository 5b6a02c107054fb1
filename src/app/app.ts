import { ChangeDetectionStrategy, Component } from '@angular/core';
import { Shell } from './core/shell';

@Component({
  selector: 'tw-root',
  imports: [Shell],
  template: '<tw-shell />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class App {}
