import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatCheckbox } from '@angular/material/checkbox';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { CAUTION_LIMITS, CAUTIONS, HAZARDS, type Hazard } from '../../../domain/sets/hazards';
import { fieldError } from '../../core/form-problems';
import type { SetForm } from './set-form-model';

/** Those a voltage belongs to. */
const ELECTRIC: readonly Hazard[] = ['high-voltage', 'stored-charge', 'hot-chassis', 'mains-cord', 'picture-tube'];

/** The checklist of what can hurt in a set; each caution stands beside the hazard it belongs to. Presentational. */
@Component({
  selector: 'tw-hazards-field',
  imports: [MatCheckbox, MatFormFieldModule, MatInput, ReactiveFormsModule],
  template: `
    <h2 id="set-hazards">Hazards</h2>
    <p class="tw-mute">Shown first wherever work on the set is shown.</p>
    <ul aria-labelledby="set-hazards">
      @for (hazard of all; track hazard) {
        @let controls = hazards().controls[hazard].controls;
        <li>
          <mat-checkbox [formControl]="controls.on">{{ cautions[hazard].label }}</mat-checkbox>
          @if (controls.on.value) {
            <p class="caution">{{ cautions[hazard].whatToDo }}</p>
            <div class="detail">
              @if (electric.includes(hazard)) {
                <mat-form-field class="volts">
                  <mat-label>Highest voltage</mat-label>
                  <input matInput inputmode="numeric" autocomplete="off" [formControl]="controls.volts" />
                  <span matTextSuffix>V</span>
                  <mat-error>{{ fieldError(controls.volts) }}</mat-error>
                </mat-form-field>
              }
              <mat-form-field>
                <mat-label>Where, and what is known</mat-label>
                <input matInput autocomplete="off" [formControl]="controls.note" />
                <mat-error>{{ fieldError(controls.note) }}</mat-error>
              </mat-form-field>
            </div>
          }
        </li>
      }
    </ul>
    <p class="tw-basis">{{ limits }}</p>
  `,
  styles: `
    :host {
      display: block;
    }
    h2 {
      margin: 0;
      font: var(--mat-sys-title-medium);
    }
    p {
      margin: 0;
    }
    ul {
      display: grid;
      grid-template-columns: repeat(auto-fill, minmax(min(100%, 420px), 1fr));
      gap: 4px 24px;
      margin: 8px 0;
      padding: 0;
      list-style: none;
    }
    .caution {
      margin: 0 0 12px 12px;
      padding: 8px 12px;
      border-radius: var(--tw-corner-control);
      background: var(--mat-sys-tertiary-container);
      color: var(--mat-sys-on-tertiary-container);
      font: var(--mat-sys-body-small);
    }
    .detail {
      display: flex;
      align-items: start;
      margin-bottom: 12px;
      gap: 12px;
      margin-left: 12px;
    }
    .volts {
      flex: 0 0 140px;
    }
    .detail mat-form-field:last-child {
      flex: 1;
    }
    @media (max-width: 599px) {
      .detail {
        display: grid;
        margin-left: 0;
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HazardsField {
  readonly hazards = input.required<SetForm['controls']['hazards']>();

  protected readonly all = HAZARDS;
  protected readonly cautions = CAUTIONS;
  protected readonly electric = ELECTRIC;
  protected readonly limits = CAUTION_LIMITS;
  protected readonly fieldError = fieldError;
}
