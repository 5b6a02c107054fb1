import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { DatePipe } from '@angular/common';
import { MatButton } from '@angular/material/button';
import type { SetDetail } from '../../../contracts/sets';
import { Notice } from '../../ui/notice';
import { differences } from './set-differences';

/** Somebody else has saved first: what they changed, and the two ways on. Nothing typed is lost until one is taken. */
@Component({
  selector: 'tw-edit-conflict',
  imports: [DatePipe, MatButton, Notice],
  template: `
    <tw-notice tone="caution" role="alert">
      <h2>Somebody else has changed this set since you opened it</h2>
      <p>Saved {{ now().updatedAt | date: 'd MMM yyyy, HH:mm' }}. What you typed is still below and is not saved.</p>
      @if (changes().length > 0) {
        <table>
          <thead>
            <tr>
              <th scope="col">Changed</th>
              <th scope="col">Was</th>
              <th scope="col">Is now</th>
            </tr>
          </thead>
          <tbody>
            @for (change of changes(); track change.label) {
              <tr>
                <th scope="row">{{ change.label }}</th>
                <td>{{ change.before || 'Nothing' }}</td>
                <td>{{ change.now || 'Nothing' }}</td>
              </tr>
            }
          </tbody>
        </table>
      } @else {
        <p>Nothing of what this form holds reads differently.</p>
      }
      <div class="ways">
        <button matButton="outlined" type="button" [disabled]="saving()" (click)="loadTheirs.emit()">
          Load theirs, drop mine
        </button>
        <button matButton="filled" type="button" [disabled]="saving()" (click)="saveOver.emit()">
          Save mine over theirs
        </button>
      </div>
    </tw-notice>
  `,
  styles: `
    :host {
      display: block;
      margin-bottom: 20px;
    }
    h2 {
      margin: 0 0 4px;
      font: var(--mat-sys-title-small);
    }
    p {
      margin: 0;
    }
    table {
      width: 100%;
      margin: 10px 0;
      border-collapse: collapse;
    }
    th,
    td {
      padding: 6px 12px 6px 0;
      border-top: 1px solid currentColor;
      font: var(--mat-sys-body-medium);
      text-align: left;
      vertical-align: top;
      overflow-wrap: anywhere;
    }
    th {
      font-weight: 700;
    }
    .ways {
      display: flex;
      flex-wrap: wrap;
      gap: 12px;
      margin-top: 12px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EditConflict {
  readonly before = input.required<SetDetail>();
  readonly now = input.required<SetDetail>();
  readonly saving = input(false);

  readonly loadTheirs = output();
  readonly saveOver = output();

  protected readonly changes = computed(() => differences(this.before(), this.now()));
}
