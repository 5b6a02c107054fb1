import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatHint, MatLabel, MatSuffix } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { Router } from '@angular/router';
import { setUpPractice } from '../../../contracts/session';
import { fieldError, zodField } from '../../core/form-problems';
import { FormSubmission } from '../../core/form-submission';
import { SessionStore } from '../../core/session';
import { Notice } from '../../ui/notice';
import { Reveal } from './reveal';

const { practiceName, name, email, password } = setUpPractice.body.shape;

/** Names the practice and its first administrator; afterwards on to rates and taxes. */
@Component({
  selector: 'tw-set-up-page',
  imports: [
    MatButton,
    MatError,
    MatFormField,
    MatHint,
    MatInput,
    MatLabel,
    MatSuffix,
    Notice,
    ReactiveFormsModule,
    Reveal,
  ],
  templateUrl: './set-up-page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetUpPage {
  private readonly sessions = inject(SessionStore);
  private readonly router = inject(Router);

  protected readonly form = inject(NonNullableFormBuilder).group({
    practiceName: ['', zodField(practiceName)],
    name: ['', zodField(name)],
    email: ['', zodField(email)],
    password: ['', zodField(password)],
  });
  protected readonly submission = new FormSubmission(this.form);
  protected readonly fieldError = fieldError;

  protected setUp(): void {
    this.submission.send(
      () => this.sessions.setUp(this.form.getRawValue()),
      () => void this.router.navigateByUrl('/practice'),
    );
  }
}
