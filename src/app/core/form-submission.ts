import { afterNextRender, ElementRef, inject, Injector, signal } from '@angular/core';
import type { FormGroup } from '@angular/forms';
import { finalize, type Observable } from 'rxjs';
import { ApiProblem } from './api-client';
import { showProblem } from './form-problems';

/**
 * A form on its way to the server. What is wrong lands on the fields it concerns, and the first of them takes the
 * focus; what concerns no field is `problem`. Make it where a component is made: it looks for fields in that component.
 */
export class FormSubmission {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  private readonly injector = inject(Injector);
  private readonly isSending = signal(false);
  private readonly text = signal('');

  readonly sending = this.isSending.asReadonly();
  /** Fit to show above the form; empty where there is nothing to say. */
  readonly problem = this.text.asReadonly();

  constructor(private readonly form: FormGroup) {}

  /**
   * Sends a form that is valid, once at a time. `refused` may take a problem for its own; then nothing else is said
   * of it.
   */
  send<T>(
    request: () => Observable<T>,
    done: (reply: T) => void,
    refused: (problem: ApiProblem) => boolean = () => false,
  ): void {
    if (this.isSending()) return;
    this.text.set('');
    this.form.markAllAsTouched();
    if (this.form.invalid) return this.focusFirstError();
    this.isSending.set(true);
    request()
      .pipe(finalize(() => this.isSending.set(false)))
      .subscribe({
        next: done,
        error: (error: unknown) => {
          if (!(error instanceof ApiProblem)) throw error;
          if (refused(error)) return;
          this.text.set(showProblem(this.form, error));
          this.focusFirstError();
        },
      });
  }

  private focusFirstError(): void {
    afterNextRender(() => this.host.querySelector<HTMLElement>('[formControlName].ng-invalid')?.focus(), {
      injector: this.injector,
    });
  }
}
