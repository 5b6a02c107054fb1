import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import {
  MatDialogActions,
  MatDialogClose,
  MatDialogContent,
  MatDialogRef,
  MatDialogTitle,
} from '@angular/material/dialog';
import { MatError, MatFormField, MatHint, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatOption, MatSelect } from '@angular/material/select';
import { inviteUser } from '../../../contracts/users';
import { ROLE_LABELS, ROLES, type Role } from '../../../domain/access/policy';
import { fieldError, zodField } from '../../core/form-problems';
import { FormSubmission } from '../../core/form-submission';
import { Notice } from '../../ui/notice';
import { PeopleApi, type Invitation } from './people-api';

const { name, email } = inviteUser.body.shape;

const MAY: Readonly<Record<Role, string>> = {
  administrator: 'Everything, and people, rates and taxes.',
  restorer: 'Registers sets, prices the work, writes estimates.',
  appraiser: 'Registers sets and records their worth; reads estimates.',
  collector: 'Sees the sets recorded as their own, with what was estimated for them.',
};

/** Invites a person; closes with the invitation. */
@Component({
  selector: 'tw-invite-dialog',
  imports: [
    MatButton,
    MatDialogActions,
    MatDialogClose,
    MatDialogContent,
    MatDialogTitle,
    MatError,
    MatFormField,
    MatHint,
    MatInput,
    MatLabel,
    MatOption,
    MatSelect,
    Notice,
    ReactiveFormsModule,
  ],
  templateUrl: './invite-dialog.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InviteDialog {
  private readonly api = inject(PeopleApi);
  private readonly dialog = inject<MatDialogRef<InviteDialog, Invitation>>(MatDialogRef);

  private readonly fields = inject(NonNullableFormBuilder);
  protected readonly form = this.fields.group({
    name: ['', zodField(name)],
    email: ['', zodField(email)],
    role: this.fields.control<Role>('restorer'),
  });
  protected readonly submission = new FormSubmission(this.form);
  protected readonly fieldError = fieldError;
  protected readonly roles = ROLES.map((role) => ({ role, label: ROLE_LABELS[role] }));
  protected readonly may = (role: Role) => MAY[role];

  protected invite(): void {
    this.submission.send(
      () => this.api.invite(this.form.getRawValue()),
      (invitation) => this.dialog.close(invitation),
    );
  }
}
