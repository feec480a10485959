/**
 * The pages of Halfmark as typed functions, so that a link to a page that does not exist does not compile. Each gives a
 * path that begins with a slash; `absolute` makes it whole for mail.
 */
export const paths = {
  home: () => '/',
  signIn: (next?: string) => (next ? `/sign-in?${new URLSearchParams({ next }).toString()}` : '/sign-in'),
  forgottenPassword: () => '/forgotten-password',
  setPassword: (token: string) => `/set-password?${new URLSearchParams({ token }).toString()}`,
  course: (courseId: string) => `/courses/${courseId}`,
  sets: (courseId: string) => `/courses/${courseId}/sets`,
  set: (courseId: string, setId: string) => `/courses/${courseId}/sets/${setId}`,
  report: (courseId: string, setId: string) => `/courses/${courseId}/sets/${setId}/report`,
  queue: (courseId: string) => `/courses/${courseId}/queue`,
  queueItem: (courseId: string, itemId: string) => `/courses/${courseId}/queue/${itemId}`,
  intakes: (courseId: string) => `/courses/${courseId}/intakes`,
  intake: (courseId: string, intakeId: string) => `/courses/${courseId}/intakes/${intakeId}`,
  templates: (courseId: string) => `/courses/${courseId}/templates`,
  template: (courseId: string, templateId: string) => `/courses/${courseId}/templates/${templateId}`,
  consistency: (courseId: string) => `/courses/${courseId}/consistency`,
  roster: (courseId: string) => `/courses/${courseId}/roster`,
  bench: () => '/bench',
} as const;

/** A path as a whole address, for mail and for callers outside the browser. */
export function absolute(appUrl: string, path: string): string {
  return new URL(path, `${appUrl}/`).toString();
}
