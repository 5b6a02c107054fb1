import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatLabel, MatSuffix } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { ActivatedRoute, Router, RouterLink } from '@angular/router';
import { map } from 'rxjs';
import { signIn } from '../../../contracts/session';
import { fieldError, zodField } from '../../core/form-problems';
import { FormSubmission } from '../../core/form-submission';
import { HOME } from '../../core/navigation';
import { SessionStore } from '../../core/session';
import { Notice } from '../../ui/notice';
import { Wordmark } from '../../ui/wordmark';
import { DemoAccounts } from './demo-accounts';
import { Reveal } from './reveal';
import { SignInScale } from './sign-in-scale';

const { email, password } = signIn.body.shape;

/** E-mail and password; afterwards on to the address that was asked for. */
@Component({
  selector: 'tw-sign-in-page',
  imports: [
    DemoAccounts,
    MatButton,
    MatError,
    MatFormField,
    MatInput,
    MatLabel,
    MatSuffix,
    Notice,
    ReactiveFormsModule,
    Reveal,
    RouterLink,
    SignInScale,
    Wordmark,
  ],
  templateUrl: './sign-in-page.html',
  styleUrl: './sign-in-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignInPage {
  private readonly sessions = inject(SessionStore);
  private readonly router = inject(Router);

  /** The address to go on to, where one was asked for. No input of the page: a component with a `then` is awaited. */
  protected readonly goOn = toSignal(inject(ActivatedRoute).queryParamMap.pipe(map((params) => params.get('then'))), {
    requireSync: true,
  });
  protected readonly demo = computed(() => this.sessions.session()?.demo === true);
  protected readonly practiceName = computed(() => this.sessions.session()?.practiceName ?? '');
  protected readonly form = inject(NonNullableFormBuilder).group({
    email: ['', zodField(email)],
    password: ['', zodField(password)],
  });
  protected readonly submission = new FormSubmission(this.form);
  protected readonly fieldError = fieldError;

  protected fill(account: { email: string; password: string }): void {
    this.form.setValue(account);
  }

  protected signIn(): void {
    this.submission.send(
      () => this.sessions.signIn(this.form.getRawValue()),
      () => void this.router.navigateByUrl(this.goOn() ?? HOME),
    );
  }
}
