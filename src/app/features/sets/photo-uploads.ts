import { HttpClient, HttpEventType } from '@angular/common/http';
import { inject, Injectable, signal } from '@angular/core';
import { catchError, concatMap, EMPTY, filter, Subject, takeUntil, tap, type Observable } from 'rxjs';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { addPhoto, photo as photoSchema, type Photo } from '../../../contracts/sets';
import { addressOf, toApiProblem } from '../../core/api-client';
import type { UploadRow } from '../../ui/photo-drop';

const MOST_BYTES = 25 * 1024 * 1024;

interface Upload extends UploadRow {
  readonly file: File;
}

/**
 * Photographs on their way to a set, one after the other, each with its own progress, problem and retry. HttpClient
 * sends by XHR here, which reports progress.
 */
@Injectable()
export class PhotoUploads {
  private readonly http = inject(HttpClient);
  private readonly uploads = signal<readonly Upload[]>([]);
  private readonly queue = new Subject<{ readonly setId: number; readonly upload: Upload }>();
  private readonly given = new Subject<number>();
  private count = 0;

  readonly rows = this.uploads.asReadonly();
  readonly added = new Subject<Photo>();

  constructor() {
    this.queue
      .pipe(
        concatMap(({ setId, upload }) => this.send(setId, upload)),
        takeUntilDestroyed(),
      )
      .subscribe();
  }

  add(setId: number, files: readonly File[]): void {
    for (const file of files) {
      const upload: Upload = { id: ++this.count, name: file.name, percent: 0, problem: null, file };
      this.uploads.update((all) => [...all, upload]);
      if (file.size > MOST_BYTES) this.change(upload.id, { problem: 'Larger than 25 MB. Send a smaller file.' });
      else this.queue.next({ setId, upload });
    }
  }

  retry(setId: number, id: number): void {
    const upload = this.uploads().find((row) => row.id === id);
    if (upload === undefined) return;
    this.change(id, { problem: null, percent: 0 });
    this.queue.next({ setId, upload });
  }

  /** Takes a file off the list; what is on its way is stopped. */
  drop(id: number): void {
    this.given.next(id);
    this.uploads.update((all) => all.filter((row) => row.id !== id));
  }

  private send(setId: number, { id, file }: Upload): Observable<unknown> {
    if (!this.uploads().some((row) => row.id === id)) return EMPTY;
    const body = new FormData();
    body.append('photo', file, file.name);
    const dropped = this.given.pipe(filter((given) => given === id));
    return this.http.post(addressOf(addPhoto, { id: setId }), body, { observe: 'events', reportProgress: true }).pipe(
      tap((event) => {
        if (event.type === HttpEventType.UploadProgress && event.total)
          this.change(id, { percent: Math.round((100 * event.loaded) / event.total) });
        if (event.type === HttpEventType.Response) {
          this.uploads.update((all) => all.filter((row) => row.id !== id));
          this.added.next(photoSchema.parse(event.body));
        }
      }),
      catchError((error: unknown) => {
        this.change(id, { problem: toApiProblem(error).message });
        return EMPTY;
      }),
      takeUntil(dropped),
    );
  }

  private change(id: number, part: Partial<UploadRow>): void {
    this.uploads.update((all) => all.map((row) => (row.id === id ? { ...row, ...part } : row)));
  }
}
