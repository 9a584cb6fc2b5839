import type { Database } from './database/database';

/** Where "now" comes from: use cases and jobs are given it, SQL never asks for the time. */
export interface Clock {
  now(): Promise<Date>;
}

export const systemClock: Clock = { now: async () => new Date() };

/** A clock that stands still until it is moved, for tests and seeds. */
export class SetClock implements Clock {
  constructor(private instant: Date) {}
  async now(): Promise<Date> {
    return new Date(this.instant);
  }
  set(instant: Date): void {
    this.instant = new Date(instant);
  }
}

/** The demo's clock: the real one moved by what the database holds, so that every process tells the same time. */
export class MovableClock implements Clock {
  constructor(private readonly database: Database) {}

  async now(): Promise<Date> {
    const { rows } = await this.database.pool.query('select offset_seconds from app_clock');
    return new Date(Date.now() + rows[0].offset_seconds * 1000);
  }

  async moveTo(instant: Date): Promise<void> {
    const seconds = Math.round((instant.getTime() - Date.now()) / 1000);
    await this.database.pool.query('update app_clock set offset_seconds = $1', [seconds]);
  }
}
