import { paths } from '@/lib/paths';
import { changeAccount } from '@/lib/services/change-account';
import { createCourse } from '@/lib/services/create-course';
import { editCourse } from '@/lib/services/edit-course';
import { inviteAccount } from '@/lib/services/invite-account';
import { retryJob } from '@/lib/services/retry-job';
import { type Expectation, type Row } from '../matrix/row';

/** Open to administrators, refused to everybody else. */
const administratorsOnly: Expectation = ['sign-in', 'refuse', 'refuse', 'refuse', 'refuse', 'allow', 'refuse'];

const courseFields = {
  title: 'Two-level systems',
  term: 'Autumn 2026',
  timeZone: 'UTC',
  tasSeeOwnSectionsOnly: false,
  notice: '',
};

/** The administration. */
export const rows: readonly Row[] = [
  { kind: 'page', file: '(admin)/admin/courses/page.tsx', path: paths.adminCourses, expect: administratorsOnly },
  {
    kind: 'page',
    file: '(admin)/admin/courses/[courseId]/page.tsx',
    path: (scene) => paths.adminCourse(scene.course.id),
    expect: administratorsOnly,
  },
  {
    kind: 'action',
    file: '(admin)/admin/courses/actions.ts',
    action: 'makeCourse',
    services: ['createCourse'],
    run: (context) => createCourse(context, { ...courseFields, code: 'PHY 999', department: 'Physics' }),
    expect: administratorsOnly,
  },
  {
    kind: 'action',
    file: '(admin)/admin/courses/actions.ts',
    action: 'saveCourse',
    services: ['editCourse'],
    run: (context, scene) =>
      editCourse(context, { ...courseFields, code: 'PHY 998', courseId: scene.course.id, retentionMonths: 12 }),
    expect: administratorsOnly,
  },
  { kind: 'page', file: '(admin)/admin/accounts/page.tsx', path: paths.adminAccounts, expect: administratorsOnly },
  {
    kind: 'page',
    file: '(admin)/admin/accounts/[userId]/page.tsx',
    path: (scene) => paths.adminAccount(scene.student.user.id),
    expect: administratorsOnly,
  },
  {
    kind: 'action',
    file: '(admin)/admin/accounts/actions.ts',
    action: 'makeAccount',
    services: ['inviteAccount'],
    run: (context) => inviteAccount(context, { email: 'newcomer@wrenfield.example', name: 'Nia Brook' }),
    expect: administratorsOnly,
  },
  {
    kind: 'action',
    file: '(admin)/admin/accounts/actions.ts',
    action: 'saveAccount',
    services: ['changeAccount'],
    run: (context, scene) => changeAccount(context, { userId: scene.bystander.id, change: 'make-administrator' }),
    expect: administratorsOnly,
  },
  { kind: 'page', file: '(admin)/admin/mail/page.tsx', path: paths.adminMail, expect: administratorsOnly },
  {
    kind: 'action',
    file: '(admin)/admin/mail/actions.ts',
    action: 'tryJobAgain',
    services: ['retryJob'],
    // There is no such job, which an administrator alone is told.
    run: (context) => retryJob(context, { jobId: '999999' }),
    expect: ['sign-in', 'refuse', 'refuse', 'refuse', 'refuse', 'hide', 'refuse'],
  },
  { kind: 'page', file: '(admin)/admin/log/page.tsx', path: paths.adminLog, expect: administratorsOnly },
];
