import type { OpenDatabase } from './client';

/**
 * Runs work of many steps, with waiting between them, as one transaction: a failure, a stop or a power cut in the
 * middle leaves the file as it was. Transactions that the steps open themselves become savepoints of this one.
 * Only for a start, while nothing else uses the connection: everything written on it meanwhile would share its fate.
 */
export async function allOrNothing<T>({ sqlite }: OpenDatabase, work: () => Promise<T>): Promise<T> {
  sqlite.exec('begin immediate');
  try {
    const result = await work();
    sqlite.exec('commit');
    return result;
  } catch (error) {
    sqlite.exec('rollback');
    throw error;
  }
}
