import { DOCUMENT } from '@angular/common';
import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';

/** Copies a text to the clipboard and says whether that worked. */
@Component({
  selector: 'tw-copy-button',
  imports: [MatButton, MatIcon],
  template: `
    <button matButton="outlined" type="button" (click)="copy()">
      <mat-icon [svgIcon]="icon()" aria-hidden="true" />
      {{ label() }}
    </button>
    <span class="said" role="status">{{ said() }}</span>
  `,
  styles: `
    :host {
      display: inline-flex;
      align-items: center;
      gap: 10px;
    }
    .said {
      font: var(--mat-sys-body-small);
      color: var(--mat-sys-on-surface-variant);
    }
    .said:empty {
      display: none;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CopyButton {
  readonly text = input.required<string>();
  readonly label = input.required<string>();
  readonly icon = input('content_copy');

  private readonly document = inject(DOCUMENT);
  protected readonly said = signal('');

  protected async copy(): Promise<void> {
    try {
      // Absent outside secure addresses; the catch then says so.
      await this.document.defaultView?.navigator.clipboard.writeText(this.text());
      this.said.set('Copied');
    } catch {
      this.said.set('The browser does not allow copying here.');
    }
    setTimeout(() => this.said.set(''), 4000);
  }
}
