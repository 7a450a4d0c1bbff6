import { z } from 'zod';
import { POINT_IDS } from './point-ids.ts';

/** A point of measure, parsed from outside. */
export const pointIdSchema = z.enum(POINT_IDS);
