import { type Patch } from './violations';

const elsewhere = '00000000-0000-4000-8000-000000000001';
const now = '2026-10-05T12:00:00Z';
const another = { id: '00000000-0000-4000-8000-000000000002' };

/** By table and unique constraint or index: how a second row repeats what may be there once, and nothing else. */
export const repetitions: Record<string, Record<string, Patch>> = {
  users: { users_email_unique: another },
  departments: { departments_name_unique: another },
  courses: { courses_code_term_unique: another },
  sections: { sections_name_unique: another },
  memberships: { memberships_course_user_unique: another },
  section_graders: { section_graders_section_membership_unique: another },
  conflicts_of_interest: { conflicts_of_interest_pair_unique: another },
  api_tokens: { api_tokens_token_hash_unique: another },
  template_versions: { template_versions_number_unique: another },
  problem_sets: { problem_sets_number_unique: another },
  problem_set_items: { problem_set_items_position_unique: another },
  extensions: {
    extensions_user_unique: another,
  },
  set_releases: { set_releases_set_user_unique: another },
  intakes: { intakes_committed_content_unique: { ...another, state: 'done' } },
  draws: { draws_item_user_unique: another },
  saved_answers: { saved_answers_part_unique: another },
  submissions: {
    submissions_receipt_unique: { ...another, client_key: null },
    submissions_client_key_unique: { ...another, receipt: 'RCPT-OTHER' },
  },
  answers: {
    answers_attempt_unique: { ...another, submission_id: elsewhere, superseded_at: now },
    answers_standing_unique: { ...another, submission_id: elsewhere, attempt: 99 },
    answers_submission_part_unique: { ...another, draw_id: elsewhere, attempt: 99 },
  },
  answer_checks: { answer_checks_once_unique: another },
  credit_entries: {
    credit_entries_first_unique: { ...another, previous_entry_id: null },
    credit_entries_previous_unique: another,
  },
  intake_rows: {
    intake_rows_answer_unique: { ...another, line: 999 },
    intake_rows_line_unique: { ...another, answer_id: null },
  },
  queue_items: {
    queue_items_live_unique: { ...another, state: 'waiting', kind: 'review', appeal_id: null },
    queue_items_appeal_unique: { ...another, state: 'withdrawn' },
  },
  rulings: { rulings_sequence_unique: another },
  ruling_reversals: { ruling_reversals_ruling_unique: another },
  second_markings: { second_markings_ruling_unique: another },
  credit_rules: { credit_rules_standing_unique: another },
  comment_snippets: { comment_snippets_text_unique: another },
  score_reports: { score_reports_revision_unique: another },
  deliveries: {
    deliveries_score_report_unique: { ...another, message_id: '<other@wrenfield.example>' },
    deliveries_message_id_unique: { ...another, score_report_id: elsewhere },
  },
  appeals: { appeals_part_unique: another },
};
