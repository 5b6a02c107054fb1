import { DOCUMENT } from '@angular/common';
import { inject, Injectable } from '@angular/core';
import { convertToParamMap, type ParamMap, type Params } from '@angular/router';
import { SessionStore } from '../../core/session';

/** Remembers, on this browser and for each person, how the list of sets was last filtered and sorted. */
@Injectable({ providedIn: 'root' })
export class LastUsedFilter {
  private readonly storage = inject(DOCUMENT).defaultView?.localStorage;
  private readonly session = inject(SessionStore);

  read(): ParamMap {
    const text = this.storage?.getItem(this.key()) ?? '';
    return convertToParamMap(Object.fromEntries(new URLSearchParams(text)));
  }

  write(params: Params): void {
    const kept = new URLSearchParams(params);
    kept.delete('page');
    try {
      this.storage?.setItem(this.key(), kept.toString());
    } catch (error) {
      // A full or forbidden storage costs a convenience only.
      if (!(error instanceof DOMException)) throw error;
    }
  }

  private key(): string {
    return `thenworth.sets.filter.${this.session.user()?.id ?? 0}`;
  }
}
