import { inject, Injectable } from '@angular/core';
import type { Observable } from 'rxjs';
import { getPractice, updatePractice, type Practice } from '../../../contracts/practice';
import { ApiClient } from '../../core/api-client';

@Injectable({ providedIn: 'root' })
export class PracticeApi {
  private readonly client = inject(ApiClient);

  get(): Observable<Practice> {
    return this.client.call(getPractice);
  }

  update(practice: Practice): Observable<Practice> {
    return this.client.call(updatePractice, { body: practice });
  }
}
