import { ChangeDetectionStrategy, Component, input, signal } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';

/** Shows what is typed into a password field, and hides it again. */
@Component({
  selector: 'tw-reveal',
  imports: [MatIcon, MatIconButton],
  template: `
    <button matIconButton type="button" aria-label="Show the password" [attr.aria-pressed]="shown()" (click)="toggle()">
      <mat-icon [svgIcon]="shown() ? 'visibility_off' : 'visibility'" />
    </button>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Reveal {
  readonly field = input.required<HTMLInputElement>();
  protected readonly shown = signal(false);

  protected toggle(): void {
    this.shown.update((shown) => !shown);
    this.field().type = this.shown() ? 'text' : 'password';
  }
}
