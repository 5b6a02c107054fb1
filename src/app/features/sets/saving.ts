import { signal } from '@angular/core';
import type { FormGroup } from '@angular/forms';
import type { Observable } from 'rxjs';
import { ApiProblem } from '../../core/api-client';
import { showProblem } from '../../core/form-problems';

/** The saving of one form: whether it is on its way, and what the server said against it. */
export class Saving {
  readonly busy = signal(false);
  readonly trouble = signal('');

  constructor(private readonly form: FormGroup) {}

  /** Runs the request if the form is valid; otherwise marks what is not. */
  run<T>(request: () => Observable<T>, done: (saved: T) => void): void {
    if (this.form.invalid) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.trouble.set('');
    request().subscribe({
      next: (saved) => {
        this.busy.set(false);
        done(saved);
      },
      error: (error: unknown) => {
        this.busy.set(false);
        if (!(error instanceof ApiProblem)) throw error;
        this.trouble.set(showProblem(this.form, error));
      },
    });
  }
}
