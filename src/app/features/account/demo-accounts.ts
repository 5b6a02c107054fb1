import { ChangeDetectionStrategy, Component, output } from '@angular/core';
import { ROLE_LABELS, type Role } from '../../../domain/access/policy';

/** The demo practice's accounts; they exist in no other. */
const ACCOUNTS: readonly { readonly email: string; readonly role: Role; readonly sees: string }[] = [
  { email: 'restorer@quayside.example', role: 'restorer', sees: 'sets, estimates, papers' },
  { email: 'appraiser@quayside.example', role: 'appraiser', sees: 'sets and their worth' },
  { email: 'collector@quayside.example', role: 'collector', sees: 'only the sets of one’s own' },
  { email: 'admin@quayside.example', role: 'administrator', sees: 'all of it, people and rates too' },
];
const PASSWORD = 'thenworth-demo';

/** Fills the sign-in form with an account of the demo practice. */
@Component({
  selector: 'tw-demo-accounts',
  template: `
    <h2>This is the demo practice</h2>
    <p>Everything in it is invented. Choose a role to fill the form; the password is {{ password }}.</p>
    <ul>
      @for (account of accounts; track account.email) {
        <li>
          <button type="button" (click)="choose.emit({ email: account.email, password })">
            <b>{{ label(account.role) }}</b>
            <span>{{ account.sees }}</span>
          </button>
        </li>
      }
    </ul>
  `,
  styleUrl: './demo-accounts.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DemoAccounts {
  readonly choose = output<{ email: string; password: string }>();

  protected readonly accounts = ACCOUNTS;
  protected readonly password = PASSWORD;
  protected readonly label = (role: Role) => ROLE_LABELS[role];
}
