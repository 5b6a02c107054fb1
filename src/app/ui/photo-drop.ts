import { ChangeDetectionStrategy, Component, input, output, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatProgressBar } from '@angular/material/progress-bar';

/** One file on its way, or refused. */
export interface UploadRow {
  readonly id: number;
  readonly name: string;
  /** Of the file, sent so far. */
  readonly percent: number;
  /** Why it was refused, in words; null while nothing is wrong. */
  readonly problem: string | null;
}

/** Takes photographs by button or drop, and shows each file's way. Presentational. */
@Component({
  selector: 'tw-photo-drop',
  imports: [MatButton, MatIcon, MatProgressBar],
  templateUrl: './photo-drop.html',
  styleUrl: './photo-drop.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PhotoDrop {
  readonly uploads = input.required<readonly UploadRow[]>();

  readonly files = output<File[]>();
  readonly retry = output<number>();
  readonly remove = output<number>();

  protected readonly over = signal(false);

  protected chosen(event: Event): void {
    const field = event.target as HTMLInputElement;
    this.send(field.files);
    field.value = ''; // the same file may be chosen again
  }

  protected dropped(event: DragEvent): void {
    event.preventDefault();
    this.over.set(false);
    this.send(event.dataTransfer?.files ?? null);
  }

  protected dragged(event: DragEvent): void {
    if (!event.dataTransfer?.types.includes('Files')) return;
    event.preventDefault();
    this.over.set(true);
  }

  private send(list: FileList | null): void {
    const files = [...(list ?? [])];
    if (files.length > 0) this.files.emit(files);
  }
}
