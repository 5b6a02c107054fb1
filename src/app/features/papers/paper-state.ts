import { catchError, map, of, startWith, type Observable } from 'rxjs';
import type { Paper } from '../../../domain/documents/paper';
import { ApiProblem } from '../../core/api-client';
import type { PaperState } from './paper-frame';

/** A document on its way: loading, then ready, or failed with its problem. Other errors go on. */
export const paperState = (paper: Observable<Paper>): Observable<PaperState> =>
  paper.pipe(
    map((ready): PaperState => ({ status: 'ready', paper: ready })),
    startWith<PaperState>({ status: 'loading' }),
    catchError((error: unknown) => {
      if (error instanceof ApiProblem) return of<PaperState>({ status: 'failed', problem: error });
      throw error;
    }),
  );
