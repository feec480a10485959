/** What a token may be used for; each is one door of the HTTP interface. */
export const tokenScopes = ['check-answers', 'export-marks'] as const;

export type TokenScope = (typeof tokenScopes)[number];

const sentences: Record<TokenScope, string> = {
  'check-answers': 'Have answers checked against references',
  'export-marks': "Read this course's marks",
};

/** What a scope allows, as a person reads it. */
export function tokenScopeSentence(scope: TokenScope): string {
  return sentences[scope];
}
