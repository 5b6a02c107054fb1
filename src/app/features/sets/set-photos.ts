import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { takeUntilDestroyed, toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router } from '@angular/router';
import type { Photo } from '../../../contracts/sets';
import { ApiProblem } from '../../core/api-client';
import { Confirm } from '../../ui/confirm';
import { Empty } from '../../ui/empty';
import { Notice } from '../../ui/notice';
import { PhotoDrop } from '../../ui/photo-drop';
import { PhotoGrid, type CaptionChange } from './photo-grid';
import { PhotoUploads } from './photo-uploads';
import { PhotoViewer } from './photo-viewer';
import { SetStore } from './set-store';

/** A set's photographs: adding, captions, order, and a large view whose photograph the address names. */
@Component({
  selector: 'tw-set-photos',
  imports: [Empty, Notice, PhotoDrop, PhotoGrid, PhotoViewer],
  providers: [PhotoUploads],
  template: `
    @if (store.set(); as set) {
      @if (store.mayEdit()) {
        <tw-photo-drop
          [uploads]="uploads.rows()"
          (files)="uploads.add(set.id, $event)"
          (retry)="uploads.retry(set.id, $event)"
          (remove)="uploads.drop($event)"
        />
      }
      @if (trouble()) {
        <tw-notice tone="error" role="alert">{{ trouble() }}</tw-notice>
      }
      @if (set.photos.length > 0) {
        <tw-photo-grid
          [photos]="set.photos"
          [mayEdit]="store.mayEdit()"
          (open)="look($event)"
          (captionChange)="caption($event)"
          (orderChange)="order($event)"
          (remove)="remove($event)"
        />
      } @else {
        <tw-empty title="No photographs yet" text="The first one stands for the set in the list." />
      }
      @if (looking(); as photo) {
        <tw-photo-viewer [photos]="set.photos" [shown]="photo" (shownChange)="look($event)" (closed)="look(null)" />
      }
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 20px;
      grid-template-columns: minmax(0, 1fr);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetPhotos {
  protected readonly store = inject(SetStore);
  protected readonly uploads = inject(PhotoUploads);
  private readonly confirm = inject(Confirm);
  private readonly router = inject(Router);
  private readonly route = inject(ActivatedRoute);
  private readonly query = toSignal(this.route.queryParamMap, { requireSync: true });

  protected readonly trouble = signal('');
  protected readonly looking = computed(() => {
    const id = Number(this.query().get('photo') ?? 0);
    return this.store.set()?.photos.find((photo) => photo.id === id);
  });

  constructor() {
    this.uploads.added.pipe(takeUntilDestroyed()).subscribe((photo) => this.store.photoAdded(photo));
  }

  protected look(photo: Photo | null): void {
    void this.router.navigate([], {
      relativeTo: this.route,
      queryParams: { photo: photo?.id ?? null },
      replaceUrl: photo !== null && this.looking() !== undefined,
    });
  }

  protected caption({ photo, caption }: CaptionChange): void {
    this.store.caption(photo.id, caption).subscribe(this.told());
  }

  protected order(photos: readonly Photo[]): void {
    this.store.orderPhotos(photos).subscribe(this.told());
  }

  protected remove(photo: Photo): void {
    this.confirm
      .ask({
        title: 'Remove this photograph?',
        text: `${photo.caption === '' ? 'The photograph' : `“${photo.caption}”`} is deleted for good.`,
        action: 'Remove',
      })
      .subscribe((yes) => {
        if (yes) this.store.removePhoto(photo.id).subscribe(this.told());
      });
  }

  private told() {
    this.trouble.set('');
    return {
      error: (error: unknown) => {
        if (!(error instanceof ApiProblem)) throw error;
        this.trouble.set(error.message);
        this.store.reload(); // shows what is really on record
      },
    };
  }
}
