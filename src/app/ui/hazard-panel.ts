import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import { CAUTION_LIMITS, CAUTIONS, type Hazard } from '../../domain/sets/hazards';

export interface HazardOnRecord {
  readonly hazard: Hazard;
  readonly volts: number | null;
  readonly note: string;
}

/** What can hurt in a set, with the voltage in figures and what to do. Never collapsible, never dismissible. */
@Component({
  selector: 'tw-hazard-panel',
  imports: [MatIcon],
  template: `
    @for (entry of shown(); track entry.hazard) {
      <h3><mat-icon svgIcon="bolt" aria-hidden="true" />{{ entry.title }}</h3>
      <p>{{ entry.whatToDo }}</p>
      @if (entry.note) {
        <p class="note">{{ entry.note }}</p>
      }
    }
    <p class="limits">{{ limits }}</p>
  `,
  styles: `
    :host {
      display: block;
      position: relative;
      overflow: hidden;
      padding: 14px 18px 15px 34px;
      border: 1px solid var(--tw-hazard);
      border-radius: var(--tw-corner-panel);
      background: var(--tw-hazard);
      color: var(--tw-on-hazard);
      font: var(--mat-sys-body-small);
    }
    :host::before {
      content: '';
      position: absolute;
      inset: 0 auto 0 0;
      width: 14px;
      background: repeating-linear-gradient(-45deg, var(--tw-hazard-stripe) 0 9px, var(--tw-hazard) 9px 18px);
    }
    h3 {
      display: flex;
      gap: 9px;
      align-items: center;
      color: var(--tw-hazard-stripe);
    }
    h3:not(:first-of-type) {
      margin-top: 10px;
    }
    p {
      margin-top: 3px;
    }
    .limits {
      margin-top: 10px;
      opacity: 0.85;
    }
    .mat-icon {
      flex: none;
      width: 20px;
      height: 20px;
    }
  `,
  host: { role: 'note', 'aria-label': 'Hazards of this set' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HazardPanel {
  readonly entries = input.required<readonly HazardOnRecord[]>();
  protected readonly limits = CAUTION_LIMITS;
  protected readonly shown = computed(() =>
    this.entries().map(({ hazard, volts, note }) => ({
      hazard,
      note,
      title: volts === null ? CAUTIONS[hazard].title : `${CAUTIONS[hazard].title}: ${formatVolts(volts)}`,
      whatToDo: CAUTIONS[hazard].whatToDo,
    })),
  );
}

/** `385 V`, `9.2 kV`. */
export const formatVolts = (volts: number): string =>
  volts < 1000 ? `${volts} V` : `${Number((volts / 1000).toFixed(1))} kV`;
