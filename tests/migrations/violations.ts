/** What a valid row of a table becomes invalid by: changed columns, as JSON. */
export type Patch = Record<string, unknown>;

const somebody = '00000000-0000-4000-8000-000000000001';
const now = '2026-10-05T12:00:00Z';
const long = (length: number) => 'x'.repeat(length + 1);
const words = (count: number) => Array.from({ length: count + 1 }, (_, index) => `w${index}`);
const settled = {
  state: 'settled',
  credit: 5,
  marked_at: now,
  settled_by: somebody,
  settled_credit: 5,
  settled_at: now,
};
const answered = { state: 'answered', outcome: 'kept', reply: 'No.', answered_by: somebody, answered_at: now };
const matched = { user_id: somebody, item_id: somebody, part_key: 'a', text: '1' };

/** By table and CHECK constraint: changes that only that constraint refuses. */
export const checkViolations: Record<string, Record<string, Patch[]>> = {
  users: {
    users_email_check: [
      { email: 'Ada@wrenfield.example' },
      { email: ' a@b.c' },
      { email: 'nobody' },
      { email: `a@${long(254)}` },
    ],
    users_erased_check: [{ erased_at: now }, { erased_at: now, deactivated_at: now, password_hash: 'kept' }],
    users_name_check: [{ name: '  ' }, { name: long(200) }],
  },
  sessions: { sessions_id_check: [{ id: 'plain' }] },
  link_tokens: { link_tokens_purpose_check: [{ purpose: 'greeting' }] },
  departments: { departments_name_check: [{ name: '' }] },
  courses: {
    courses_code_check: [{ code: ' ' }],
    courses_notice_check: [{ notice: long(4000) }],
    courses_retention_months_check: [{ retention_months: 0 }],
    courses_term_check: [{ term: '' }],
    courses_time_zone_check: [{ time_zone: '' }],
    courses_title_check: [{ title: '' }],
  },
  sections: { sections_name_check: [{ name: ' ' }] },
  memberships: {
    memberships_role_check: [{ role: 'owner', section_id: null }],
    memberships_section_check: [{ role: 'ta', section_id: somebody }],
  },
  conflicts_of_interest: {
    conflicts_of_interest_note_check: [{ note: long(2000) }],
    conflicts_of_interest_pair_check: [{ grader_id: somebody, student_id: somebody }],
  },
  api_tokens: {
    api_tokens_name_check: [{ name: '' }],
    api_tokens_scopes_check: [{ scopes: [] }, { scopes: words(20) }],
    api_tokens_token_hash_check: [{ token_hash: 'a token in the clear' }],
  },
  templates: {
    templates_draft_check: [{ draft: [] }],
    templates_draft_revision_check: [{ draft_revision: 0 }],
    templates_name_check: [{ name: ' ' }],
    templates_topics_check: [{ topics: words(30) }],
  },
  template_versions: {
    template_versions_content_check: [{ content: 'text' }],
    template_versions_content_hash_check: [{ content_hash: 'short' }],
    template_versions_number_check: [{ number: 0 }],
  },
  problem_sets: {
    problem_sets_attempts_allowed_check: [{ attempts_allowed: 0 }, { attempts_allowed: 101 }],
    problem_sets_dated_check: [{ opens_at: null }, { closes_at: null }],
    problem_sets_number_check: [{ number: 0 }],
    problem_sets_policy_check: [{ policy: [] }],
    problem_sets_revision_check: [{ revision: 0 }],
    problem_sets_state_check: [{ state: 'archived' }],
    problem_sets_times_check: [{ opens_at: now, closes_at: now }, { appeals_until: '2000-01-01T00:00:00Z' }],
    problem_sets_title_check: [{ title: '' }],
  },
  problem_set_items: {
    problem_set_items_points_check: [{ points: 0 }, { points: 1_000_000_001 }],
    problem_set_items_position_check: [{ position: 0 }],
  },
  extensions: {
    extensions_reason_check: [{ reason: long(2000) }],
    extensions_whom_check: [
      { user_id: null, section_id: null },
      { user_id: somebody, section_id: somebody },
    ],
  },
  stored_files: {
    stored_files_byte_size_check: [{ byte_size: -1 }],
    stored_files_content_hash_check: [{ content_hash: '../../etc/passwd' }],
    stored_files_media_type_check: [{ media_type: '' }],
    stored_files_original_name_check: [{ original_name: long(255) }],
  },
  intakes: {
    intakes_committed_at_check: [{ state: 'done', committed_at: null }],
    intakes_content_hash_check: [{ content_hash: 'short' }],
    intakes_counts_check: [
      { rows_total: 1, rows_accepted: 1, rows_refused: 1 },
      { rows_total: 2, rows_accepted: 1, rows_committed: 2 },
      { rows_total: 2, rows_accepted: 2, rows_committed: 1, rows_checked: 2 },
      { rows_refused: -1 },
    ],
    intakes_failure_check: [
      { state: 'failed', failure: null },
      { state: 'uploaded', failure: 'Lost.' },
    ],
    intakes_state_check: [{ state: 'paused' }],
  },
  draws: { draws_drawn_values_check: [{ drawn_values: [] }], draws_seed_check: [{ seed: '' }] },
  saved_answers: {
    saved_answers_part_key_check: [{ part_key: '' }],
    saved_answers_revision_check: [{ revision: 0 }],
    saved_answers_text_check: [{ text: long(20_000) }],
  },
  submissions: {
    submissions_client_key_check: [{ client_key: '' }],
    submissions_intake_check: [
      { source: 'intake', intake_id: null },
      { source: 'typed', intake_id: somebody },
    ],
    submissions_receipt_check: [{ receipt: 'R-1' }],
    submissions_source_check: [{ source: 'dictated', intake_id: null }],
  },
  answers: {
    answers_attempt_check: [{ attempt: 0 }],
    answers_check_state_check: [{ check_state: 'running' }],
    answers_checked_check: [{ check_state: 'checked', current_check_id: null }],
    answers_part_key_check: [{ part_key: '' }],
    answers_text_check: [{ text: long(20_000) }],
  },
  answer_checks: {
    answer_checks_checker_version_check: [{ checker_version: '' }],
    answer_checks_evidence_check: [{ evidence: [] }],
    answer_checks_follow_through_basis_check: [{ follow_through_basis: long(200) }],
    answer_checks_form_check: [{ form: 'simplified' }],
    answer_checks_milliseconds_check: [{ milliseconds: -1 }],
    answer_checks_slip_check: [{ verdict: 'agrees', slip: 'sign' }],
    answer_checks_slips_check: [{ slips: {} }],
    answer_checks_verdict_check: [{ verdict: 'maybe', slip: null }],
  },
  credit_entries: {
    credit_entries_credit_check: [{ credit: 3001, out_of: 3000 }, { credit: -1 }],
    credit_entries_reason_check: [{ reason: long(4000) }],
    credit_entries_ruled_check: ['ruling', 'kin-ruling', 'settlement', 'appeal'].map((source) => ({
      source,
      ruling_id: null,
    })),
    credit_entries_source_check: [{ source: 'guess' }],
  },
  intake_rows: {
    intake_rows_answer_check: [{ state: 'refused', reason_code: 'late', answer_id: somebody }],
    intake_rows_cell_check: [{ cell: -1 }],
    intake_rows_fields_check: [{ fields: 'text' }],
    intake_rows_line_check: [{ line: 0 }],
    intake_rows_matched_check: Object.keys(matched).map((column) => ({
      state: 'accepted',
      reason_code: null,
      ...matched,
      [column]: null,
    })),
    intake_rows_reason_check: [
      { state: 'refused', reason_code: null, answer_id: null },
      { state: 'accepted', reason_code: 'late', ...matched },
    ],
    intake_rows_state_check: [{ state: 'skipped', reason_code: null, answer_id: null, ...matched }],
  },
  queue_items: {
    queue_items_appeal_check: [
      { kind: 'appeal', appeal_id: null },
      { kind: 'review', appeal_id: somebody },
    ],
    queue_items_held_check: [
      { state: 'taken', held_by: null, held_until: null },
      { state: 'taken', held_by: somebody, held_until: null },
      { state: 'taken', held_by: null, held_until: now },
      { state: 'waiting', held_by: somebody, held_until: now },
      { state: 'ruled', held_until: now },
    ],
    queue_items_kind_check: [{ kind: 'other', appeal_id: null }],
    queue_items_question_asked_check: [{ state: 'escalated', question: null }],
    queue_items_question_check: [{ question: long(4000) }],
    queue_items_reasons_check: [{ reasons: [] }],
    queue_items_state_check: [{ state: 'lost' }],
    queue_items_suggested_credit_check: [{ suggested_credit: -1 }],
  },
  rulings: {
    rulings_comment_check: [{ comment: long(8000) }],
    rulings_covering_check: [
      { kind: 'single', covering_ruling_id: somebody },
      { id: somebody, kind: 'kin', covering_ruling_id: somebody },
    ],
    rulings_credit_check: [{ credit: 3001, out_of: 3000 }, { credit: -1 }],
    rulings_kind_check: [{ kind: 'vote' }],
    rulings_milliseconds_spent_check: [{ milliseconds_spent: -1 }],
    rulings_reasons_check: [{ reasons: words(20) }],
    rulings_sequence_check: [{ sequence: 0 }],
  },
  ruling_reversals: { ruling_reversals_reason_check: [{ reason: long(4000) }] },
  second_markings: {
    second_markings_blind_check: [{ grader_id: somebody, first_grader_id: somebody }],
    second_markings_comment_check: [{ comment: long(8000) }],
    second_markings_credit_check: [{ state: 'marked', credit: -1, marked_at: now }],
    second_markings_held_check: [
      { state: 'taken', held_until: null },
      { state: 'assigned', held_until: now },
    ],
    second_markings_marked_check: [
      { state: 'assigned', credit: 5, marked_at: now },
      { state: 'marked', credit: null, marked_at: now },
      { state: 'marked', credit: 5, marked_at: null },
      { state: 'to-settle', credit: null, marked_at: null },
      { state: 'cancelled', credit: 5, marked_at: null },
    ],
    second_markings_milliseconds_spent_check: [{ milliseconds_spent: -1 }],
    second_markings_settled_check: [
      { ...settled, settled_by: null },
      { ...settled, settled_credit: null },
      { ...settled, settled_at: null },
      { ...settled, state: 'marked' },
    ],
    second_markings_settled_credit_check: [{ ...settled, settled_credit: -1 }],
    second_markings_state_check: [{ state: 'lost' }],
  },
  credit_rules: {
    credit_rules_credit_check: [{ credit: -1 }],
    credit_rules_slip_check: [{ slip: '' }],
  },
  comment_snippets: { comment_snippets_text_check: [{ text: ' ' }] },
  score_reports: {
    score_reports_content_check: [{ content: [] }],
    score_reports_reason_check: [{ reason: '' }],
    score_reports_revision_check: [{ revision: 0 }],
  },
  deliveries: {
    deliveries_attempts_check: [{ attempts: -1 }],
    deliveries_message_id_check: [{ message_id: '' }],
    deliveries_sending_check: ['sending', 'unconfirmed'].map((state) => ({ state, sending_at: null })),
    deliveries_sent_check: [
      { state: 'sent', sending_at: now, sent_at: null },
      { state: 'waiting', sent_at: now },
    ],
    deliveries_state_check: [{ state: 'bounced' }],
  },
  appeals: {
    appeals_answered_check: [
      { ...answered, outcome: null },
      { ...answered, reply: null },
      { ...answered, answered_by: null },
      { ...answered, answered_at: null },
      { ...answered, state: 'open' },
    ],
    appeals_outcome_check: [{ ...answered, outcome: 'maybe' }],
    appeals_reason_check: [{ reason: ' ' }],
    appeals_reply_check: [{ ...answered, reply: ' ' }],
    appeals_state_check: [{ state: 'lost' }],
  },
  audit_events: {
    audit_events_action_check: [{ action: 'Open Set' }],
    audit_events_actor_check: [
      { actor_kind: 'user', actor_id: null },
      { actor_kind: 'system', actor_id: somebody },
    ],
    audit_events_actor_kind_check: [{ actor_kind: 'robot', actor_id: somebody }],
    audit_events_details_check: [{ details: [] }],
    audit_events_subject_check: [{ subject_kind: 'answer', subject_id: null }],
  },
};
