import { ChangeDetectionStrategy, Component, computed, inject, viewChild } from '@angular/core';
import { FormGroupDirective, NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatHint, MatLabel, MatSuffix } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import { MatInput } from '@angular/material/input';
import { MatSnackBar } from '@angular/material/snack-bar';
import { Router } from '@angular/router';
import { filter, switchMap } from 'rxjs';
import { changePassword } from '../../../contracts/session';
import { ROLE_LABELS } from '../../../domain/access/policy';
import { ApiClient, ApiProblem } from '../../core/api-client';
import { fieldError, zodField } from '../../core/form-problems';
import { FormSubmission } from '../../core/form-submission';
import { SessionStore } from '../../core/session';
import { Confirm } from '../../ui/confirm';
import { Notice } from '../../ui/notice';
import { Reveal } from './reveal';

const { currentPassword, newPassword } = changePassword.body.shape;

/** Who one is here, one's password, and signing out of every device. */
@Component({
  selector: 'tw-account-page',
  imports: [
    MatButton,
    MatError,
    MatFormField,
    MatHint,
    MatIcon,
    MatInput,
    MatLabel,
    MatSuffix,
    Notice,
    ReactiveFormsModule,
    Reveal,
  ],
  templateUrl: './account-page.html',
  styleUrl: './account-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AccountPage {
  private readonly api = inject(ApiClient);
  private readonly sessions = inject(SessionStore);
  private readonly router = inject(Router);
  private readonly confirm = inject(Confirm);
  private readonly snackBar = inject(MatSnackBar);
  private readonly formDirective = viewChild.required(FormGroupDirective);

  protected readonly user = this.sessions.user;
  protected readonly roleLabel = computed(() => ROLE_LABELS[this.user()?.role ?? 'collector']);
  protected readonly practiceName = computed(() => this.sessions.session()?.practiceName ?? '');
  protected readonly form = inject(NonNullableFormBuilder).group({
    currentPassword: ['', zodField(currentPassword)],
    newPassword: ['', zodField(newPassword)],
  });
  protected readonly submission = new FormSubmission(this.form);
  protected readonly fieldError = fieldError;

  protected changePassword(): void {
    this.submission.send(
      () => this.api.call(changePassword, { body: this.form.getRawValue() }),
      () => {
        this.formDirective().resetForm(); // so that the emptied fields are not marked as wrong
        this.snackBar.open('Your password is changed. Other devices are signed out.', 'Close', { duration: 8000 });
      },
    );
  }

  protected signOutEverywhere(): void {
    this.confirm
      .ask({
        title: 'Sign out everywhere?',
        text: 'Every device that is signed in as you, this one too, has to sign in again.',
        action: 'Sign out everywhere',
      })
      .pipe(
        filter((sure) => sure),
        switchMap(() => this.sessions.signOutEverywhere()),
      )
      .subscribe({
        next: () => void this.router.navigateByUrl('/sign-in'),
        error: (error: unknown) => {
          if (!(error instanceof ApiProblem)) throw error;
          this.snackBar.open(`You are still signed in. ${error.message}`, 'Close');
        },
      });
  }
}
