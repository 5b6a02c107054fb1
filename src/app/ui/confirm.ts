import { ChangeDetectionStrategy, Component, inject, Injectable } from '@angular/core';
import { MatButton } from '@angular/material/button';
import {
  MAT_DIALOG_DATA,
  MatDialog,
  MatDialogActions,
  MatDialogClose,
  MatDialogContent,
  MatDialogTitle,
} from '@angular/material/dialog';
import { map, type Observable } from 'rxjs';

export interface Question {
  readonly title: string;
  readonly text: string;
  /** What happens, as the button's words. */
  readonly action: string;
  /** The way back; «Cancel» unless named. */
  readonly keep?: string;
}

@Component({
  selector: 'tw-confirm-dialog',
  imports: [MatButton, MatDialogActions, MatDialogClose, MatDialogContent, MatDialogTitle],
  template: `
    <h2 mat-dialog-title>{{ question.title }}</h2>
    <mat-dialog-content>{{ question.text }}</mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton [mat-dialog-close]="false" cdkFocusInitial>{{ question.keep ?? 'Cancel' }}</button>
      <button matButton="filled" [mat-dialog-close]="true">{{ question.action }}</button>
    </mat-dialog-actions>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class ConfirmDialog {
  protected readonly question = inject<Question>(MAT_DIALOG_DATA);
}

/** Asks before what cannot be undone. */
@Injectable({ providedIn: 'root' })
export class Confirm {
  private readonly dialog = inject(MatDialog);

  ask(question: Question): Observable<boolean> {
    return this.dialog
      .open<ConfirmDialog, Question, boolean>(ConfirmDialog, { data: question, maxWidth: 460, role: 'alertdialog' })
      .afterClosed()
      .pipe(map((answer) => answer === true));
  }
}
