import { ChangeDetectionStrategy, Component, computed, inject, linkedSignal } from '@angular/core';
import { rxResource, toSignal } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatPaginator } from '@angular/material/paginator';
import { MatOption, MatSelect } from '@angular/material/select';
import { ActivatedRoute, Router, RouterLink } from '@angular/router';
import { map } from 'rxjs';
import { ESTIMATE_SORTS } from '../../../contracts/estimates';
import { formatDate } from '../../../domain/calendar/period';
import { formatMoney } from '../../../domain/money/money';
import { Empty } from '../../ui/empty';
import { Failed } from '../../ui/failed';
import { SkeletonRows } from '../../ui/skeleton-rows';
import { StatusChip } from '../../ui/status-chip';
import { VerdictMark } from '../../ui/verdict-mark';
import { EstimatesApi, PAGE_SIZE } from './estimates-api';
import {
  ESTIMATE_SORT_LABELS,
  ESTIMATE_STATE_LABELS,
  ESTIMATE_STATES,
  FIRST_QUERY,
  isNarrowed,
  readQuery,
  toParams,
  type EstimatesQuery,
} from './estimates-query';

/** Every estimate the person may see: searched, filtered, sorted and paged by the address. */
@Component({
  selector: 'tw-estimates-list-page',
  imports: [
    Empty,
    Failed,
    MatButton,
    MatFormField,
    MatInput,
    MatLabel,
    MatOption,
    MatPaginator,
    MatSelect,
    RouterLink,
    SkeletonRows,
    StatusChip,
    VerdictMark,
  ],
  templateUrl: './estimates-list-page.html',
  styleUrl: './estimates-list-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EstimatesListPage {
  private readonly api = inject(EstimatesApi);
  private readonly router = inject(Router);
  private readonly route = inject(ActivatedRoute);

  protected readonly pageSize = PAGE_SIZE;
  protected readonly states = ESTIMATE_STATES;
  protected readonly stateLabels = ESTIMATE_STATE_LABELS;
  protected readonly sorts = ESTIMATE_SORTS;
  protected readonly sortLabels = ESTIMATE_SORT_LABELS;
  protected readonly formatMoney = formatMoney;
  protected readonly formatDate = formatDate;

  protected readonly query = toSignal(this.route.queryParamMap.pipe(map(readQuery)), { requireSync: true });
  protected readonly narrowed = computed(() => isNarrowed(this.query()));
  protected readonly list = rxResource({
    params: () => this.query(),
    stream: ({ params }) => this.api.list(params),
  });
  private readonly loaded = computed(() => (this.list.hasValue() ? this.list.value() : undefined));
  /** The last page that came; stays while the next is on its way. */
  protected readonly shown = linkedSignal<ReturnType<typeof this.loaded>, ReturnType<typeof this.loaded>>({
    source: this.loaded,
    computation: (now, previous) => now ?? previous?.value,
  });
  protected readonly summary = computed(() => {
    const total = this.shown()?.total;
    return total === undefined ? '' : total === 1 ? 'One estimate' : `${total} estimates`;
  });

  protected change(part: Partial<EstimatesQuery>, replaceUrl = false): void {
    const queryParams = toParams({ ...this.query(), page: 1, ...part });
    void this.router.navigate([], { relativeTo: this.route, queryParams, replaceUrl });
  }

  protected clear(): void {
    this.change({ ...FIRST_QUERY, sort: this.query().sort });
  }
}
