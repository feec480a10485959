/**
 * The pages of Halfmark as typed functions, so that a link to a page that does not exist does not compile. Each gives a
 * path that begins with a slash; `absolute` makes it whole for mail.
 */
export const paths = {
  home: () => '/',
  signIn: (next?: string) => (next ? `/sign-in?${new URLSearchParams({ next }).toString()}` : '/sign-in'),
  invitation: (token: string) => `/invitation/${token}`,
  forgottenPassword: () => '/password/forgot',
  newPassword: (token: string) => `/password/${token}`,
  account: () => '/account',

  courses: () => '/courses',
  course: (courseId: string) => `/courses/${courseId}`,
  roster: (courseId: string) => `/courses/${courseId}/roster`,
  rosterPerson: (courseId: string, membershipId: string) => `/courses/${courseId}/roster/${membershipId}`,
  log: (courseId: string) => `/courses/${courseId}/log`,
  tokens: (courseId: string) => `/courses/${courseId}/tokens`,

  newSet: (courseId: string) => `/courses/${courseId}/sets/new`,
  set: (courseId: string, setId: string) => `/courses/${courseId}/sets/${setId}`,
  intakes: (courseId: string, setId: string) => `/courses/${courseId}/sets/${setId}/intake`,
  intake: (courseId: string, setId: string, intakeId: string) =>
    `/courses/${courseId}/sets/${setId}/intakes/${intakeId}`,
  queue: (courseId: string, setId: string) => `/courses/${courseId}/sets/${setId}/queue`,
  desk: (courseId: string, setId: string, queueItemId: string) =>
    `/courses/${courseId}/sets/${setId}/desk/${queueItemId}`,
  secondMarking: (courseId: string, setId: string, secondMarkingId: string) =>
    `/courses/${courseId}/sets/${setId}/desk/second/${secondMarkingId}`,
  settle: (courseId: string, setId: string, secondMarkingId: string) =>
    `/courses/${courseId}/sets/${setId}/queue/settle/${secondMarkingId}`,
  release: (courseId: string, setId: string) => `/courses/${courseId}/sets/${setId}/release`,
  deliveries: (courseId: string, setId: string) => `/courses/${courseId}/sets/${setId}/deliveries`,
  deliveriesApi: (setId: string) => `/api/problem-sets/${setId}/deliveries`,
  reportOf: (courseId: string, setId: string, userId: string) => `/courses/${courseId}/sets/${setId}/reports/${userId}`,
  consistency: (courseId: string, setId: string) => `/courses/${courseId}/sets/${setId}/consistency`,

  templates: () => '/templates',
  newTemplate: () => '/templates/new',
  template: (templateId: string) => `/templates/${templateId}`,

  work: () => '/work',
  workSet: (setId: string) => `/work/${setId}`,
  workReport: (setId: string) => `/work/${setId}/report`,

  reading: () => '/reading',
  bench: () => '/bench',

  adminCourses: () => '/admin/courses',
  adminCourse: (courseId: string) => `/admin/courses/${courseId}`,
  adminAccounts: () => '/admin/accounts',
  adminAccount: (userId: string) => `/admin/accounts/${userId}`,
  adminMail: () => '/admin/mail',
  adminLog: () => '/admin/log',
} as const;

/** A path as a whole address, for mail and for callers outside the browser. */
export function absolute(appUrl: string, path: string): string {
  return new URL(path, `${appUrl}/`).toString();
}
