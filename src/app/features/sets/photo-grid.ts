import { CdkDrag, CdkDragHandle, CdkDropList, moveItemInArray, type CdkDragDrop } from '@angular/cdk/drag-drop';
import { ChangeDetectionStrategy, Component, input, output, signal } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import type { Photo } from '../../../contracts/sets';

export interface CaptionChange {
  readonly photo: Photo;
  readonly caption: string;
}

/** Photographs in order: captions edited in place, order by drag or by button. Presentational. */
@Component({
  selector: 'tw-photo-grid',
  imports: [CdkDrag, CdkDragHandle, CdkDropList, MatIcon, MatIconButton],
  templateUrl: './photo-grid.html',
  styleUrl: './photo-grid.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PhotoGrid {
  readonly photos = input.required<readonly Photo[]>();
  readonly mayEdit = input(false);

  readonly open = output<Photo>();
  readonly captionChange = output<CaptionChange>();
  readonly orderChange = output<readonly Photo[]>();
  readonly remove = output<Photo>();

  /** Said to those who do not see the order change. */
  protected readonly said = signal('');

  protected name(photo: Photo): string {
    return photo.caption === '' ? `Photograph ${this.photos().indexOf(photo) + 1}` : photo.caption;
  }

  protected dropped({ previousIndex, currentIndex }: CdkDragDrop<unknown>): void {
    this.move(previousIndex, currentIndex);
  }

  protected move(from: number, to: number): void {
    if (from === to || to < 0 || to >= this.photos().length) return;
    const photos = [...this.photos()];
    moveItemInArray(photos, from, to);
    this.said.set(`Now at place ${to + 1} of ${photos.length}.`);
    this.orderChange.emit(photos);
  }

  protected rename(photo: Photo, event: Event): void {
    const caption = (event.target as HTMLInputElement).value.trim();
    if (caption !== photo.caption) this.captionChange.emit({ photo, caption });
  }

  protected restore(photo: Photo, event: Event): void {
    const field = event.target as HTMLInputElement;
    field.value = photo.caption;
    field.blur();
  }
}
