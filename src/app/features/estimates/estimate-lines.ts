import { ChangeDetectionStrategy, Component, computed, ElementRef, inject, input, output } from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatMenu, MatMenuItem, MatMenuTrigger } from '@angular/material/menu';
import type { EstimateDetail, EstimateLine, LineContent } from '../../../contracts/estimates';
import {
  LINE_KIND_LABELS,
  LINE_KINDS,
  STAGE_LABELS,
  STAGES,
  type LineKind,
  type Stage,
} from '../../../domain/estimate/terms';
import { formatMoney } from '../../../domain/money/money';
import { formatVolts } from '../../ui/hazard-panel';
import { EstimateStore } from './estimate-store';
import { LineEditor } from './line-editor';
import { lineWords } from './line-words';

const KIND_ICONS: Readonly<Record<LineKind, string>> = {
  labour: 'schedule',
  part: 'deployed_code',
  outside: 'local_shipping',
};

/** The lines by stage; one row at a time is open for typing. */
@Component({
  selector: 'tw-estimate-lines',
  imports: [LineEditor, MatButton, MatIcon, MatIconButton, MatMenu, MatMenuItem, MatMenuTrigger],
  templateUrl: './estimate-lines.html',
  styleUrl: './estimate-lines.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EstimateLines {
  readonly estimate = input.required<EstimateDetail>();
  readonly editable = input.required<boolean>();
  readonly removed = output<{
    readonly line: EstimateLine;
    readonly afterLineId: number | null;
    readonly wasFirst: boolean;
  }>();

  protected readonly store = inject(EstimateStore);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  protected readonly kinds = LINE_KINDS;
  protected readonly kindLabels = LINE_KIND_LABELS;
  protected readonly kindIcons = KIND_ICONS;
  protected readonly allStages = STAGES;
  protected readonly stageLabels = STAGE_LABELS;
  protected readonly formatMoney = formatMoney;
  protected readonly lineWords = lineWords;

  /** Stages with lines, and the one a new line is being typed for. */
  protected readonly stages = computed(() => {
    const { lines, totals } = this.estimate();
    const adding = this.addingTo();
    return STAGES.flatMap((stage) => {
      const sums = totals.stages.find((sum) => sum.stage === stage);
      if (sums === undefined && adding !== stage) return [];
      return [
        {
          stage,
          label: STAGE_LABELS[stage],
          lines: lines.filter(({ content }) => content.stage === stage),
          hours: sums === undefined || sums.hours === '0.00' ? '' : `${sums.hours} h`,
          subtotal: sums?.subtotal ?? '0.00',
        },
      ];
    });
  });
  protected readonly addingTo = computed(() => {
    const open = this.store.openLine();
    return open?.lineId === null ? open.typed.stage : null;
  });
  protected readonly unusedStages = computed(() =>
    STAGES.filter((stage) => !this.stages().some((s) => s.stage === stage)),
  );
  /** The highest voltage on record stands beside the stage in which the set is first powered. */
  protected readonly volts = computed(() => {
    const highest = Math.max(0, ...this.estimate().set.hazards.map(({ volts }) => volts ?? 0));
    return highest === 0 ? '' : formatVolts(highest);
  });

  protected save(event: { readonly content: LineContent; readonly another: boolean }): void {
    const open = this.store.openLine();
    const { kind, stage } = event.content;
    const backTo = open?.lineId ?? null;
    this.store.saveLine(event.content, () => {
      if (event.another) this.store.beginLine(kind, stage);
      else if (backTo !== null) this.focusRow(backTo);
    });
  }

  protected giveUp(): void {
    const backTo = this.store.openLine()?.lineId ?? null;
    this.store.closeLine();
    if (backTo !== null) this.focusRow(backTo);
  }

  protected keepMine(content: LineContent): void {
    const trouble = this.store.lineTrouble();
    if (trouble?.kind === 'changed') this.store.keepMine(content, trouble.theirs);
  }

  protected takeTheirs(): void {
    this.store.closeLine();
    this.store.refresh();
  }

  protected remove(line: EstimateLine): void {
    const { lines } = this.estimate();
    const own = lines.filter(({ content }) => content.stage === line.content.stage);
    const at = own.findIndex(({ id }) => id === line.id);
    const next = own[at + 1] ?? own[at - 1];
    this.store.removeLine(line, () => {
      this.removed.emit({ line, afterLineId: own[at - 1]?.id ?? null, wasFirst: at === 0 });
      if (next !== undefined) this.focusRow(next.id);
    });
  }

  protected move(line: EstimateLine, by: -1 | 1): void {
    const own = this.estimate().lines.filter(({ content }) => content.stage === line.content.stage);
    const at = own.findIndex(({ id }) => id === line.id);
    if (own[at + by] === undefined) return;
    const after = by === 1 ? own[at + 1] : own[at - 2];
    this.store.moveLine(line.id, after?.id ?? null, () => this.focusRow(line.id));
  }

  protected onRowKey(event: KeyboardEvent, line: EstimateLine): void {
    const by = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
    if (by !== 0 && event.altKey && this.editable()) this.move(line, by);
    else if (by !== 0 && !event.altKey) this.focusNeighbour(line, by);
    else if (event.key === 'Delete' && this.editable()) this.remove(line);
    else return;
    event.preventDefault();
  }

  protected begin(kind: LineKind, stage: Stage): void {
    this.store.beginLine(kind, stage);
  }

  private focusNeighbour(line: EstimateLine, by: -1 | 1): void {
    const { lines } = this.estimate();
    const next = lines[lines.findIndex(({ id }) => id === line.id) + by];
    if (next !== undefined) this.focusRow(next.id);
  }

  private focusRow(lineId: number): void {
    setTimeout(() => this.host.querySelector<HTMLElement>(`[data-line="${lineId}"]`)?.focus());
  }
}
