import { ChangeDetectionStrategy, Component, computed, ElementRef, inject, input, output, signal } from '@angular/core';
import { formatPeriod, yearOf, type Period } from '../../domain/calendar/period';
import { yearScaleInput, type YearScaleContent } from '../../domain/year-scale/content';
import { drawYearScale, type Needle } from '../../domain/year-scale/geometry';
import { timeOnScale } from '../../domain/year-scale/axis';
import { nearestStop, needleLimits, stepNeedle, type Step } from '../../domain/year-scale/stops';
import { elementWidth } from './element-width';
import { YearScaleSvg } from './year-scale-drawing';

type Who = 'then' | 'now';

/** Under this width the glass has its own drawing for phones. */
const PHONE_UNDER = 640;
/** Half of the 48 px that a finger needs. */
const REACH = 24;

const STEPS: Readonly<Record<string, Step>> = {
  ArrowRight: 1,
  ArrowUp: 1,
  ArrowLeft: -1,
  ArrowDown: -1,
  PageUp: 10,
  PageDown: -10,
  Home: 'first',
  End: 'last',
};

/**
 * The large year scale. Both needles are sliders: dragged by tag or line, or moved by keys (arrows a year, Page keys a
 * decade, Home and End to the ends). A needle halts at the other one; the tab order stays then, now.
 */
@Component({
  selector: 'tw-year-scale',
  imports: [YearScaleSvg],
  templateUrl: './year-scale.html',
  styleUrl: './year-scale.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: {
    role: 'group',
    'aria-label': 'Year scale',
    '[class.dragging]': 'dragging() !== null',
    '(pointerdown)': 'grab($event)',
    '(pointermove)': 'drag($event)',
    '(pointerup)': 'release()',
    '(pointercancel)': 'release()',
  },
})
export class YearScale {
  readonly content = input.required<YearScaleContent>();
  /** Where needles can come to rest, oldest first. */
  readonly stops = input.required<readonly Period[]>();

  readonly thenChange = output<Period>();
  readonly nowChange = output<Period>();

  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  private readonly width = elementWidth(1296);
  /** The needle in hand, and how far from its place the pointer took it. */
  protected readonly dragging = signal<{ who: Who; offset: number } | null>(null);

  protected readonly drawing = computed(() => {
    const width = this.width();
    return drawYearScale(yearScaleInput(this.content(), width < PHONE_UNDER ? 'phone' : 'glass', width));
  });

  protected readonly grips = computed(() => {
    const { from, to } = this.content();
    const drawing = this.drawing();
    return [
      this.grip(
        'then',
        'Paid in',
        from,
        to,
        drawing.then,
        `Paid in ${formatPeriod(from)}: ${drawing.then.amount?.text}`,
      ),
      this.grip(
        'now',
        'Restated to',
        to,
        from,
        drawing.now,
        `Restated to ${formatPeriod(to)}: ${drawing.now.amount?.text}`,
      ),
    ];
  });

  protected press(event: KeyboardEvent, who: Who): void {
    const step = STEPS[event.key];
    if (step === undefined || event.ctrlKey || event.altKey || event.metaKey) return;
    event.preventDefault();
    const { needle, limits } = this.reach(who);
    this.move(who, stepNeedle(this.stops(), needle, step, limits));
  }

  protected grab(event: PointerEvent): void {
    if (event.button !== 0) return;
    const x = this.pointerX(event);
    const who = this.needleAt(event, x);
    if (who === null) return;
    event.preventDefault();
    this.host.setPointerCapture(event.pointerId);
    this.host.querySelector<HTMLElement>(`[data-needle="${who}"]`)?.focus();
    this.dragging.set({ who, offset: x - this.drawing()[who].head.x });
  }

  protected drag(event: PointerEvent): void {
    const held = this.dragging();
    if (held === null) return;
    const { first, last } = this.content();
    const drawing = this.drawing();
    const time = timeOnScale(this.pointerX(event) - held.offset, first, last, drawing.width, drawing.size);
    const { needle, limits } = this.reach(held.who);
    this.move(held.who, nearestStop(this.stops(), time, limits) ?? needle);
  }

  protected release(): void {
    this.dragging.set(null);
  }

  private move(who: Who, to: Period): void {
    if (to === this.reach(who).needle) return;
    if (who === 'then') this.thenChange.emit(to);
    else this.nowChange.emit(to);
  }

  private reach(who: Who) {
    const { from, to } = this.content();
    const [needle, other] = who === 'then' ? [from, to] : [to, from];
    return { needle, limits: needleLimits(this.stops(), needle, other, who) };
  }

  private pointerX(event: PointerEvent): number {
    const box = this.host.getBoundingClientRect();
    return ((event.clientX - box.left) / (box.width || 1)) * this.drawing().width;
  }

  /** The needle whose tag or line is under the pointer; of two within reach, the nearer. */
  private needleAt(event: PointerEvent, x: number): Who | null {
    const grip = event.target instanceof Element ? event.target.closest<HTMLElement>('[data-needle]') : null;
    if (grip) return grip.dataset['needle'] === 'now' ? 'now' : 'then';
    const distance = (who: Who) => Math.abs(x - this.drawing()[who].head.x);
    const nearer: Who = distance('then') <= distance('now') ? 'then' : 'now';
    return distance(nearer) <= REACH ? nearer : null;
  }

  private grip(who: Who, label: string, needle: Period, other: Period, drawn: Needle, valueText: string) {
    const { width, height } = this.drawing();
    const limits = needleLimits(this.stops(), needle, other, who);
    const tag = drawn.tag ?? { x: drawn.head.x - REACH, y: drawn.line.y2, width: 2 * REACH, height: 2 * REACH };
    return {
      who,
      label,
      valueText,
      value: yearOf(needle),
      least: yearOf(limits.least),
      most: yearOf(limits.most),
      left: ((tag.x + tag.width / 2) / width) * 100,
      top: ((tag.y + tag.height / 2) / height) * 100,
      width: tag.width,
      height: tag.height,
    };
  }
}
