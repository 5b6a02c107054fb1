import { inject, Injectable } from '@angular/core';
import { map, type Observable } from 'rxjs';
import type { BodyOf, ReplyOf } from '../../../contracts/contract';
import { inviteUser, listUsers, renewInvitation, updateUser, type User } from '../../../contracts/users';
import { ApiClient } from '../../core/api-client';

export type Invitation = ReplyOf<typeof inviteUser>;

@Injectable({ providedIn: 'root' })
export class PeopleApi {
  private readonly client = inject(ApiClient);

  list(): Observable<User[]> {
    return this.client.call(listUsers).pipe(map(({ items }) => items));
  }

  invite(body: BodyOf<typeof inviteUser>): Observable<Invitation> {
    return this.client.call(inviteUser, { body });
  }

  renew(id: number): Observable<Invitation> {
    return this.client.call(renewInvitation, { params: { id } });
  }

  update(id: number, body: BodyOf<typeof updateUser>): Observable<User> {
    return this.client.call(updateUser, { params: { id }, body });
  }
}
