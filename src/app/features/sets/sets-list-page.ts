import { BreakpointObserver } from '@angular/cdk/layout';
import { ChangeDetectionStrategy, Component, computed, effect, inject, linkedSignal } from '@angular/core';
import { rxResource, toSignal } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatPaginator } from '@angular/material/paginator';
import { ActivatedRoute, Router, RouterLink } from '@angular/router';
import { map, of } from 'rxjs';
import { SessionStore } from '../../core/session';
import { Empty } from '../../ui/empty';
import { Failed } from '../../ui/failed';
import { SkeletonRows } from '../../ui/skeleton-rows';
import { LastUsedFilter } from './last-used-filter';
import { SetsApi, type SetsList } from './sets-api';
import { SetsCards } from './sets-cards';
import { SetsFilters } from './sets-filters';
import { FIRST_QUERY, isNarrowed, PAGE_SIZE, readQuery, toParams, type SetsQuery } from './sets-query';
import { SetsTable } from './sets-table';

const NARROW = '(max-width: 839.98px)';

/** Every set the person may see: searched, filtered, sorted and paged by the address. */
@Component({
  selector: 'tw-sets-list-page',
  imports: [
    Empty,
    Failed,
    MatButton,
    MatIcon,
    MatPaginator,
    RouterLink,
    SetsCards,
    SetsFilters,
    SetsTable,
    SkeletonRows,
  ],
  templateUrl: './sets-list-page.html',
  styleUrl: './sets-list-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetsListPage {
  private readonly api = inject(SetsApi);
  private readonly router = inject(Router);
  private readonly route = inject(ActivatedRoute);
  private readonly lastUsed = inject(LastUsedFilter);
  private readonly session = inject(SessionStore);

  protected readonly pageSize = PAGE_SIZE;
  protected readonly mayEdit = computed(() => this.session.can('set.edit'));
  private readonly mayListOwners = computed(() => this.session.can('owner.list'));
  protected readonly narrow = toSignal(
    inject(BreakpointObserver)
      .observe(NARROW)
      .pipe(map(({ matches }) => matches)),
    { initialValue: false },
  );

  protected readonly query = toSignal(this.route.queryParamMap.pipe(map(readQuery)), { requireSync: true });
  protected readonly narrowed = computed(() => isNarrowed(this.query()));

  protected readonly list = rxResource({
    params: () => this.query(),
    stream: ({ params }) => this.api.list(params),
  });
  protected readonly owners = rxResource({
    params: () => this.mayListOwners(),
    stream: ({ params }) => (params ? this.api.owners() : of([])),
  });
  protected readonly ownerChoices = computed(() => (this.owners.hasValue() ? this.owners.value() : []));

  /** The last page that came; stays while the next is on its way. */
  protected readonly shown = linkedSignal<SetsList | undefined, SetsList | undefined>({
    source: () => (this.list.hasValue() ? this.list.value() : undefined),
    computation: (now, previous) => now ?? previous?.value,
  });
  protected readonly summary = computed(() => {
    const total = this.shown()?.total;
    return total === undefined ? '' : total === 1 ? 'One set' : `${total} sets`;
  });

  constructor() {
    if (this.route.snapshot.queryParamMap.keys.length === 0) {
      const remembered = toParams(readQuery(this.lastUsed.read()));
      if (Object.keys(remembered).length > 0) this.go(remembered, true);
    }
    // A page past the end, as after a narrower filter in a shared address, gives way to the last one.
    effect(() => {
      if (!this.list.hasValue()) return;
      const { items, total } = this.list.value();
      if (items.length === 0 && total > 0) this.change({ page: Math.ceil(total / PAGE_SIZE) }, true);
    });
  }

  /** What changes, and whether it takes the place of the last address instead of following it. */
  protected change(part: Partial<SetsQuery>, replaceUrl = false): void {
    const query = { ...this.query(), page: 1, ...part };
    this.lastUsed.write(toParams(query));
    this.go(toParams(query), replaceUrl);
  }

  protected clear(): void {
    this.change({ ...FIRST_QUERY, sort: this.query().sort });
  }

  private go(queryParams: Record<string, string>, replaceUrl: boolean): void {
    void this.router.navigate([], { relativeTo: this.route, queryParams, replaceUrl });
  }
}
