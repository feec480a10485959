import { z } from 'zod';
import { flagReasons } from './flag-reasons';

/**
 * The marking policy of a problem set. The defaults are the product's: what agrees earns full credit, a slip to which
 * the author gave a credit earns it, no answer earns zero, and everything in `flag` goes to a person.
 */
export const setPolicySchema = z.object({
  /** What goes to a person; removing a reason lets the machine's suggestion stand, where there is one. */
  flag: z
    .array(z.enum(flagReasons))
    .default([
      'undecided',
      'unreadable',
      'no-credited-slip',
      'slip-left-to-person',
      'not-evaluated',
      'follow-through',
      'scan',
    ]),
  /** Share of automatically decided answers drawn for a spot check of the checker, in thousandths. */
  spotCheckRate: z.int().min(0).max(1000).default(0),
  /** Share of rulings drawn for blind second marking, in thousandths. */
  secondMarkingRate: z.int().min(0).max(1000).default(200),
  /** Difference of credit, in thousandths of the part's credit, above which two markings are to be settled. */
  settleTolerance: z.int().min(0).max(1000).default(0),
  /** Whether the head TA sees student identities before release; the instructor always may. */
  headTaSeesIdentities: z.boolean().default(false),
  /** Whether an appeal may lower a credit; the student is told before appealing. */
  appealMayLower: z.boolean().default(false),
  /** Whether the student is told the verdict at once instead of after release. */
  showVerdictAtOnce: z.boolean().default(false),
  /** Whether score reports show the total. */
  reportShowsTotal: z.boolean().default(true),
});

export type SetPolicy = z.infer<typeof setPolicySchema>;

/** The product's default policy. */
export const defaultSetPolicy: SetPolicy = setPolicySchema.parse({});
