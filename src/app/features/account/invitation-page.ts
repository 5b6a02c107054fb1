import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatHint, MatLabel, MatSuffix } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { Router, RouterLink } from '@angular/router';
import { acceptInvitation, getInvitation } from '../../../contracts/users';
import { ROLE_LABELS, type Role } from '../../../domain/access/policy';
import { ApiClient, ApiProblem } from '../../core/api-client';
import { fieldError, zodField } from '../../core/form-problems';
import { FormSubmission } from '../../core/form-submission';
import { HOME } from '../../core/navigation';
import { SessionStore } from '../../core/session';
import { Empty } from '../../ui/empty';
import { Failed } from '../../ui/failed';
import { Notice } from '../../ui/notice';
import { Sweep } from '../../ui/sweep';
import { Reveal } from './reveal';

/** An invited person chooses a password and is in. */
@Component({
  selector: 'tw-invitation-page',
  imports: [
    Empty,
    Failed,
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
    RouterLink,
    Sweep,
  ],
  templateUrl: './invitation-page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InvitationPage {
  readonly token = input.required<string>();

  private readonly api = inject(ApiClient);
  private readonly sessions = inject(SessionStore);
  private readonly router = inject(Router);

  protected readonly invitation = rxResource({
    params: () => this.token(),
    stream: ({ params: token }) => this.api.call(getInvitation, { params: { token } }),
  });
  /** A problem that trying again will not cure: spent, replaced, or not an invitation at all. */
  protected readonly spent = computed(() => {
    const error = this.invitation.error();
    return error instanceof ApiProblem && (error.code === 'not-found' || error.code === 'invalid-input');
  });
  protected readonly otherPerson = computed(() => this.sessions.user()?.name ?? null);
  protected readonly form = inject(NonNullableFormBuilder).group({
    password: ['', zodField(acceptInvitation.body.shape.password)],
  });
  protected readonly submission = new FormSubmission(this.form);
  protected readonly fieldError = fieldError;
  protected readonly roleLabel = (role: Role) => ROLE_LABELS[role].toLowerCase();

  protected accept(): void {
    this.submission.send(
      () => this.sessions.acceptInvitation(this.token(), this.form.getRawValue().password),
      () => void this.router.navigateByUrl(HOME),
    );
  }
}
