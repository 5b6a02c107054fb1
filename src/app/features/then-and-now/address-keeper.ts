import { inject, Injectable } from '@angular/core';
import { takeUntilDestroyed, toObservable } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router } from '@angular/router';
import { debounceTime } from 'rxjs';
import { inquiryFromAddress, inquiryKey, isAnswerable, type Inquiry } from './inquiry';
import { RestatementStore } from './restatement-store';

const SETTLING_MS = 150;

/**
 * Keeps the address and the inquiry the same: the address carries every part of it, so that it can be shared, and going
 * back and forward leads through what was asked. Typing and dragging rewrite one entry of the history; turning to
 * another field begins a new one.
 */
@Injectable()
export class AddressKeeper {
  private readonly router = inject(Router);
  private readonly route = inject(ActivatedRoute);
  private readonly store = inject(RestatementStore);

  /** The field that made the latest change; null after a visit to another entry of the history. */
  private latest: string | null = null;
  private beginEntry = false;
  private written = '';

  constructor() {
    this.route.queryParamMap.pipe(takeUntilDestroyed()).subscribe((query) => {
      const inquiry = inquiryFromAddress(query);
      if (inquiryKey(inquiry) === this.written) return; // our own writing coming back
      this.latest = null;
      this.beginEntry = false;
      this.written = '';
      this.store.set(inquiry);
    });
    toObservable(this.store.inquiry)
      .pipe(debounceTime(SETTLING_MS), takeUntilDestroyed())
      .subscribe((inquiry) => this.write(inquiry));
  }

  /** A change by a field or a needle. */
  change(inquiry: Inquiry, by: string): void {
    if (by !== this.latest) this.beginEntry = true;
    this.latest = by;
    this.store.set(inquiry);
  }

  private write(inquiry: Inquiry): void {
    if (
      !isAnswerable(inquiry) ||
      inquiryKey(inquiry) === inquiryKey(inquiryFromAddress(this.route.snapshot.queryParamMap))
    )
      return;
    const replaceUrl = !this.beginEntry;
    this.beginEntry = false;
    this.written = inquiryKey(inquiry);
    void this.router.navigate([], { relativeTo: this.route, queryParams: { ...inquiry }, replaceUrl });
  }
}
