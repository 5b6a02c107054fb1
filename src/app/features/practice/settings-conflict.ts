import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Notice } from '../../ui/notice';
import { SETTING_LABELS, settingText, type SettingName, type Settings } from './settings';

/** Somebody else saved first: what theirs say where both changed, and how to take it. */
@Component({
  selector: 'tw-settings-conflict',
  imports: [MatButton, Notice],
  template: `
    <tw-notice tone="caution">
      <h2>Somebody else has changed the settings since you opened them</h2>
      <p>
        Nothing of yours is saved yet, and nothing is lost. What you had not touched shows theirs now.
        @if (differing().length === 0) {
          Look it over, then save.
        } @else {
          Where you both made a change, yours is in the form. Take theirs, or save yours over it:
        }
      </p>
      <ul>
        @for (name of differing(); track name) {
          <li>
            <span>
              <b>{{ labels[name] }}</b> theirs: {{ text(theirs(), name) }}
            </span>
            <button matButton="outlined" type="button" (click)="take.emit(name)">
              Take theirs<span class="tw-hidden"> for {{ labels[name] }}</span>
            </button>
          </li>
        }
      </ul>
    </tw-notice>
  `,
  styles: `
    :host {
      display: block;
    }
    h2 {
      font: var(--mat-sys-title-small);
    }
    li {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 16px;
      align-items: center;
      justify-content: space-between;
      margin-top: 8px;
      padding-top: 8px;
      border-top: 1px solid currentColor;
    }
    b {
      margin-right: 8px;
    }
  `,
  host: { role: 'alert' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SettingsConflict {
  readonly theirs = input.required<Settings>();
  readonly differing = input.required<readonly SettingName[]>();
  readonly take = output<SettingName>();

  protected readonly labels = SETTING_LABELS;
  protected readonly text = settingText;
}
