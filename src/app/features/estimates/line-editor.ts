import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  ElementRef,
  inject,
  input,
  output,
  signal,
  type OnInit,
  type OutputEmitterRef,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import type { LineContent } from '../../../contracts/estimates';
import { expectedHours, lineNet } from '../../../domain/estimate/line';
import { LINE_KIND_LABELS, STAGE_LABELS, STAGES } from '../../../domain/estimate/terms';
import { formatCents } from '../../../domain/money/money';
import { fieldError } from '../../core/form-problems';
import { Notice } from '../../ui/notice';
import type { LineTrouble } from './estimate-store';
import type { LineDraft } from './line-drafts';
import { makeLineForm, parsedLine, type LineForm, type TypedLine } from './line-form';
import { lineWords } from './line-words';

interface Field {
  readonly name: keyof TypedLine;
  readonly label: string;
}

const FIELDS = {
  labour: [
    { name: 'low', label: 'Low, h' },
    { name: 'likely', label: 'Likely, h' },
    { name: 'high', label: 'High, h' },
    { name: 'rate', label: 'Rate per hour' },
  ],
  part: [
    { name: 'quantity', label: 'Quantity' },
    { name: 'unitCost', label: 'Cost each' },
    { name: 'markupPercent', label: 'Markup, %' },
  ],
  outside: [
    { name: 'quote', label: 'Quote' },
    { name: 'markupPercent', label: 'Markup, %' },
  ],
} as const satisfies Record<string, readonly Field[]>;

/** The fields of the one line that is open: Enter saves, Esc gives up, leaving the row saves what is complete. */
@Component({
  selector: 'tw-line-editor',
  imports: [MatButton, Notice, ReactiveFormsModule],
  templateUrl: './line-editor.html',
  styleUrl: './line-editor.scss',
  host: { '(focusout)': 'left($event)', '(keydown.escape)': 'giveUp.emit()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LineEditor implements OnInit {
  readonly draft = input.required<LineDraft>();
  readonly currency = input.required<string>();
  readonly trouble = input<LineTrouble | null>(null);
  readonly saving = input(false);

  readonly typed = output<TypedLine>();
  /** `another`: begin a next line of the same kind and stage when saved. */
  readonly save = output<{ readonly content: LineContent; readonly another: boolean }>();
  readonly giveUp = output();
  readonly keepMine = output<LineContent>();
  readonly takeTheirs = output();
  readonly addMine = output<LineContent>();

  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  private readonly destroyRef = inject(DestroyRef);
  protected readonly stages = STAGES;
  protected readonly stageLabels = STAGE_LABELS;
  protected readonly fieldError = fieldError;
  protected readonly lineWords = lineWords;
  protected form!: LineForm;
  private readonly now = signal<TypedLine | null>(null);

  protected readonly kindLabel = computed(() => LINE_KIND_LABELS[this.draft().kind]);
  protected readonly fields = computed<readonly Field[]>(() => FIELDS[this.draft().kind]);
  /** The line as typed, computed here as the server will; null while something cannot be used. */
  private readonly content = computed(() => {
    const typed = this.now();
    return typed === null ? null : parsedLine(this.draft().kind, typed);
  });
  protected readonly net = computed(() => {
    const content = this.content();
    return content === null ? '' : formatCents(lineNet(content, 'likely'), this.currency());
  });
  protected readonly expected = computed(() => {
    const content = this.content();
    return content?.kind === 'labour' ? `${expectedHours(content.hours)} h expected` : '';
  });

  constructor() {
    afterNextRender(() => this.host.querySelector<HTMLElement>('input')?.focus());
  }

  ngOnInit(): void {
    this.form = makeLineForm(this.draft().kind, this.draft().typed);
    this.now.set(this.form.getRawValue());
    this.form.valueChanges.pipe(takeUntilDestroyed(this.destroyRef)).subscribe(() => {
      // Low, likely and high are checked against each other.
      for (const control of Object.values(this.form.controls)) control.updateValueAndValidity({ emitEvent: false });
      this.now.set(this.form.getRawValue());
      this.typed.emit(this.form.getRawValue());
    });
  }

  protected submit(another = false): void {
    const content = this.checked();
    if (content !== null) this.save.emit({ content, another });
    else this.host.querySelector<HTMLElement>('.ng-invalid input, input.ng-invalid')?.focus();
  }

  /** The line, or null after marking what cannot be used. */
  protected checked(): LineContent | null {
    this.form.markAllAsTouched();
    return this.content();
  }

  protected mine(to: OutputEmitterRef<LineContent>): void {
    const content = this.checked();
    if (content !== null) to.emit(content);
  }

  /** Leaving the row with the keyboard or the pointer saves it; an untouched or unfinished one just stays. */
  protected left({ relatedTarget }: FocusEvent): void {
    if (relatedTarget instanceof Node && this.host.contains(relatedTarget)) return;
    if (relatedTarget === null || !this.form.dirty || this.saving() || this.trouble() !== null) return;
    const content = this.content();
    if (content !== null) this.save.emit({ content, another: false });
  }
}
