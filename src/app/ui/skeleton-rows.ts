import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

/** The shape of a list that is still loading; shown only when it takes longer than 300 ms. */
@Component({
  selector: 'tw-skeleton-rows',
  template: `
    <span class="tw-hidden">{{ label() }} …</span>
    @for (row of rows(); track row) {
      <div class="row">
        <i class="picture"></i>
        <div class="text"><i></i><i class="short"></i></div>
        <i class="amount"></i>
      </div>
    }
  `,
  styles: `
    :host {
      display: block;
      animation: appear 0s 300ms both;
    }
    @keyframes appear {
      from {
        visibility: hidden;
      }
    }
    .row {
      display: flex;
      align-items: center;
      gap: var(--tw-4);
      padding: 12px 0;
      border-bottom: 1px solid var(--mat-sys-outline-variant);
    }
    i {
      display: block;
      height: 12px;
      border-radius: 4px;
      background: var(--mat-sys-surface-container-high);
    }
    .picture {
      flex: none;
      width: 44px;
      height: 44px;
    }
    .text {
      flex: 1;
      display: grid;
      gap: 8px;
    }
    .text i {
      width: min(70%, 320px);
    }
    .text .short {
      width: min(40%, 180px);
    }
    .amount {
      width: 84px;
    }
  `,
  host: { role: 'status' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SkeletonRows {
  readonly count = input(6);
  readonly label = input('Loading');
  protected readonly rows = computed(() => Array.from({ length: this.count() }, (_, at) => at));
}
