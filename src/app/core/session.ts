import { computed, inject, Injectable, signal } from '@angular/core';
import { tap, type Observable } from 'rxjs';
import { getSession, setUpPractice, signIn, signOut, signOutEverywhere, type Session } from '../../contracts/session';
import type { BodyOf } from '../../contracts/contract';
import { acceptInvitation } from '../../contracts/users';
import { can, type Action } from '../../domain/access/policy';
import { ApiClient } from './api-client';

/** Who is signed in. Loaded before the first page shows; changed by what is done here. */
@Injectable({ providedIn: 'root' })
export class SessionStore {
  private readonly api = inject(ApiClient);
  private readonly current = signal<Session | null>(null);

  readonly session = this.current.asReadonly();
  readonly user = computed(() => this.current()?.user ?? null);
  readonly role = computed(() => this.user()?.role ?? null);

  /** Whether the policy allows the action to whoever is signed in; the server asks the same again. */
  can(action: Action): boolean {
    return can(this.role(), action);
  }

  load(): Observable<Session> {
    return this.keep(this.api.call(getSession));
  }

  signIn(body: BodyOf<typeof signIn>): Observable<Session> {
    return this.keep(this.api.call(signIn, { body }));
  }

  setUp(body: BodyOf<typeof setUpPractice>): Observable<Session> {
    return this.keep(this.api.call(setUpPractice, { body }));
  }

  acceptInvitation(token: string, password: string): Observable<Session> {
    return this.keep(this.api.call(acceptInvitation, { params: { token }, body: { password } }));
  }

  signOut(): Observable<undefined> {
    return this.api.call(signOut).pipe(tap(() => this.forget()));
  }

  signOutEverywhere(): Observable<undefined> {
    return this.api.call(signOutEverywhere).pipe(tap(() => this.forget()));
  }

  /** The server says that nobody is signed in any more. */
  forget(): void {
    this.current.update((session) => session && { ...session, user: null });
  }

  private keep(session: Observable<Session>): Observable<Session> {
    return session.pipe(tap((value) => this.current.set(value)));
  }
}
