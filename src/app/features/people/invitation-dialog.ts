import { DatePipe, DOCUMENT } from '@angular/common';
import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import {
  MAT_DIALOG_DATA,
  MatDialogActions,
  MatDialogClose,
  MatDialogContent,
  MatDialogTitle,
} from '@angular/material/dialog';
import { CopyButton } from '../../ui/copy-button';
import type { Invitation } from './people-api';

/** The invitation's address, shown this once: the server keeps only its hash. */
@Component({
  selector: 'tw-invitation-dialog',
  imports: [CopyButton, DatePipe, MatButton, MatDialogActions, MatDialogClose, MatDialogContent, MatDialogTitle],
  template: `
    <h2 mat-dialog-title>Hand this address to {{ invitation.user.name }}</h2>
    <mat-dialog-content>
      <p>
        It lets {{ invitation.user.email }} choose a password, once, until
        {{ invitation.expiresAt | date: 'd MMM yyyy, HH:mm' }}. No message is sent: pass it on yourself. It is shown
        here only now.
      </p>
      <output class="address" aria-label="Invitation address">{{ address }}</output>
      <tw-copy-button label="Copy the address" [text]="address" />
    </mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton="filled" [mat-dialog-close]="true">Done</button>
    </mat-dialog-actions>
  `,
  styles: `
    .address {
      display: block;
      margin: 14px 0;
      padding: 11px 14px;
      border: 1px solid var(--mat-sys-outline-variant);
      border-radius: var(--tw-corner-control);
      background: var(--mat-sys-surface-container);
      color: var(--mat-sys-on-surface);
      overflow-wrap: anywhere;
      user-select: all;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InvitationDialog {
  protected readonly invitation = inject<Invitation>(MAT_DIALOG_DATA);
  protected readonly address = new URL(`/invitation/${this.invitation.token}`, inject(DOCUMENT).baseURI).href;
}
