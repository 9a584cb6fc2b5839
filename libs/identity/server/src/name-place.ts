import * as z from 'zod';
import { id } from '@seamwright/shared/contracts';

/** Where a page of a list by name ends: the name in small letters, and the id. */
export const namePlace = z.tuple([z.string(), id]);
