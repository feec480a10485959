import { BaseError } from 'sequelize';

/**
 * The constraints and append-only guards that services tell apart, by the name the database gives them. Their texts are
 * the database's and are never shown to a person or inspected.
 */
export const constraintNames = [
  'answer_checks_once_unique',
  'answers_attempt_unique',
  'answers_standing_unique',
  'answers_submission_part_unique',
  'api_tokens_token_hash_unique',
  'appeals_part_unique',
  'audit_events_append_only',
  'comment_snippets_text_unique',
  'conflicts_of_interest_pair_check',
  'conflicts_of_interest_pair_unique',
  'courses_code_term_unique',
  'credit_entries_append_only',
  'credit_entries_credit_check',
  'credit_entries_first_unique',
  'credit_entries_previous_unique',
  'credit_rules_standing_unique',
  'deliveries_message_id_unique',
  'deliveries_score_report_unique',
  'departments_name_unique',
  'draws_item_user_unique',
  'extensions_section_unique',
  'extensions_user_unique',
  'intake_rows_answer_unique',
  'intake_rows_line_unique',
  'intakes_committed_content_unique',
  'memberships_course_user_unique',
  'memberships_section_fkey',
  'problem_set_items_position_unique',
  'problem_sets_dated_check',
  'problem_sets_number_unique',
  'problem_sets_times_check',
  'queue_items_appeal_unique',
  'queue_items_held_check',
  'queue_items_live_unique',
  'ruling_reversals_append_only',
  'ruling_reversals_ruling_unique',
  'rulings_append_only',
  'rulings_credit_check',
  'rulings_sequence_unique',
  'saved_answers_part_unique',
  'score_reports_revision_unique',
  'second_markings_blind_check',
  'second_markings_ruling_unique',
  'section_graders_section_membership_unique',
  'sections_name_unique',
  'set_releases_set_user_unique',
  'submissions_client_key_unique',
  'submissions_receipt_unique',
  'template_versions_append_only',
  'template_versions_number_unique',
  'users_email_unique',
] as const;

export type ConstraintName = (typeof constraintNames)[number];

/** The name of the constraint that the database refused a statement by; null when it was something else. */
export function violatedConstraint(error: unknown): string | null {
  const source: unknown = error instanceof BaseError && 'parent' in error ? error.parent : error;
  if (typeof source !== 'object' || source === null || !('constraint' in source)) return null;
  return typeof source.constraint === 'string' ? source.constraint : null;
}

/** Whether an error is the database's refusal by the named constraint. */
export function isConstraintViolation(error: unknown, name: ConstraintName): boolean {
  return violatedConstraint(error) === name;
}
