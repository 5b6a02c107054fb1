import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { MatIcon } from '@angular/material/icon';
import { MatSnackBar } from '@angular/material/snack-bar';
import { filter, finalize, type Observable } from 'rxjs';
import type { User } from '../../../contracts/users';
import { ROLE_LABELS, type Role } from '../../../domain/access/policy';
import { ApiProblem } from '../../core/api-client';
import { SessionStore } from '../../core/session';
import { Confirm } from '../../ui/confirm';
import { Empty } from '../../ui/empty';
import { Failed } from '../../ui/failed';
import { SkeletonRows } from '../../ui/skeleton-rows';
import { InvitationDialog } from './invitation-dialog';
import { InviteDialog } from './invite-dialog';
import { PeopleApi, type Invitation } from './people-api';
import { PersonRow } from './person-row';

/** Everyone who may sign in, and those invited. */
@Component({
  selector: 'tw-people-page',
  imports: [Empty, Failed, MatButton, MatIcon, PersonRow, SkeletonRows],
  templateUrl: './people-page.html',
  styleUrl: './people-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PeoplePage {
  private readonly api = inject(PeopleApi);
  private readonly dialog = inject(MatDialog);
  private readonly confirm = inject(Confirm);
  private readonly snackBar = inject(MatSnackBar);
  private readonly sessions = inject(SessionStore);

  protected readonly people = rxResource({ stream: () => this.api.list() });
  protected readonly ownId = computed(() => this.sessions.user()?.id);
  protected readonly alone = computed(() => this.people.hasValue() && this.people.value().length === 1);
  protected readonly summary = computed(() => {
    if (!this.people.hasValue()) return '';
    const people = this.people.value();
    const invited = people.filter(({ state }) => state === 'invited').length;
    return `${people.length === 1 ? 'One person' : `${people.length} people`}${invited > 0 ? `, ${invited} of them invited` : ''}`;
  });
  /** The person whose change is on its way. */
  protected readonly busyId = signal<number | null>(null);

  protected invite(): void {
    this.dialog
      .open<InviteDialog, undefined, Invitation>(InviteDialog, { width: '480px' })
      .afterClosed()
      .pipe(filter((invitation) => invitation !== undefined))
      .subscribe((invitation) => this.showInvitation(invitation));
  }

  protected renew(person: User): void {
    this.change(person, this.api.renew(person.id), (invitation) => this.showInvitation(invitation));
  }

  protected changeRole(person: User, { role, restore }: { role: Role; restore: () => void }): void {
    this.change(
      person,
      this.api.update(person.id, { role }),
      (changed) => this.replace(changed, `${changed.name} is ${ROLE_LABELS[changed.role].toLowerCase()} now.`),
      restore,
    );
  }

  protected disable(person: User): void {
    this.confirm
      .ask({
        title: `Disable ${person.name}?`,
        text: 'They are signed out everywhere and cannot sign in until enabled again. What they recorded stays.',
        action: 'Disable',
      })
      .pipe(filter((sure) => sure))
      .subscribe(() => this.setDisabled(person, true));
  }

  protected enable(person: User): void {
    this.setDisabled(person, false);
  }

  private setDisabled(person: User, disabled: boolean): void {
    this.change(person, this.api.update(person.id, { disabled }), (changed) =>
      this.replace(changed, `${changed.name} is ${disabled ? 'disabled' : 'enabled'}.`),
    );
  }

  private change<T>(person: User, request: Observable<T>, done: (reply: T) => void, refused?: () => void): void {
    this.busyId.set(person.id);
    request.pipe(finalize(() => this.busyId.set(null))).subscribe({
      next: done,
      error: (error: unknown) => {
        if (!(error instanceof ApiProblem)) throw error;
        refused?.();
        this.snackBar.open(error.message, 'Close');
      },
    });
  }

  private replace(changed: User, said: string): void {
    this.people.update((people) => people?.map((person) => (person.id === changed.id ? changed : person)));
    this.snackBar.open(said, 'Close', { duration: 6000 });
  }

  private showInvitation(invitation: Invitation): void {
    this.people.reload();
    this.dialog.open(InvitationDialog, { data: invitation, width: '520px', disableClose: true });
  }
}
