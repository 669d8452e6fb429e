import { z } from 'zod';
import { line, valueIn } from './value.ts';

/** `data/soap-grades.yaml`: grades by total fatty matter, the highest first. */
export const soapGradesSchema = z
  .array(z.strictObject({ name: line, 'total-fatty-matter': valueIn('g/100 g', 1, 100) }))
  .min(1);
