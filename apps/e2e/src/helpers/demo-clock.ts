import { MovableClock, openDatabase } from '@seamwright/shared/server';
import { addresses } from '../stack/addresses';

/** Moves the application's clock, as hours pass in the plant. Tokens go on living by the real time. */
export async function moveClockTo(instant: string): Promise<void> {
  const database = openDatabase(addresses().workerDatabase);
  try {
    await new MovableClock(database).moveTo(new Date(instant));
  } finally {
    await database.close();
  }
}
