import { readIntake } from '@/lib/services/read-intake';
import { readKept } from '@/lib/uploads/storage';
import type { JobHandler } from './job-handler';

/** Reads an uploaded answer sheet for its preview. */
export const parseIntake: JobHandler<'parse-intake'> = ({ intakeId }) => readIntake(intakeId, readKept);
