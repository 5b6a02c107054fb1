import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import { MatFormField } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import { MatMenu, MatMenuItem, MatMenuTrigger } from '@angular/material/menu';
import { MatOption, MatSelect, type MatSelectChange } from '@angular/material/select';
import type { User } from '../../../contracts/users';
import { ROLE_LABELS, ROLES, type Role } from '../../../domain/access/policy';
import { StatusChip } from '../../ui/status-chip';
import { personState } from './person-state';

/** One person: name, role, state, and what the administrator can do about them. */
@Component({
  selector: 'tw-person-row',
  imports: [
    DatePipe,
    MatFormField,
    MatIcon,
    MatIconButton,
    MatMenu,
    MatMenuItem,
    MatMenuTrigger,
    MatOption,
    MatSelect,
    StatusChip,
  ],
  templateUrl: './person-row.html',
  styleUrl: './person-row.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PersonRow {
  readonly person = input.required<User>();
  /** The administrator who looks; nobody changes their own role or disables themselves. */
  readonly self = input(false);
  readonly busy = input(false);

  readonly roleChange = output<{ role: Role; restore: () => void }>();
  readonly renew = output();
  readonly disable = output();
  readonly enable = output();

  protected readonly roles = ROLES;
  protected readonly roleLabel = (role: Role) => ROLE_LABELS[role];
  protected readonly state = computed(() => personState(this.person(), Date.now()));

  protected chooseRole({ value, source }: MatSelectChange<Role>): void {
    this.roleChange.emit({ role: value, restore: () => (source.value = this.person().role) });
  }
}
