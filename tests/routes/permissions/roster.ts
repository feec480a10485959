import { paths } from '@/lib/paths';
import { changeMembership } from '@/lib/services/change-membership';
import { createApiToken } from '@/lib/services/create-api-token';
import { createSection } from '@/lib/services/create-section';
import { endMembership } from '@/lib/services/end-membership';
import { inviteToCourse } from '@/lib/services/invite-to-course';
import { resendInvitation } from '@/lib/services/resend-invitation';
import { revokeApiToken } from '@/lib/services/revoke-api-token';
import { ApiToken } from '@/models/api-token';
import { type Row } from '../matrix/row';
import { type Scene } from '../matrix/scene';

const roster = '(course)/courses/[courseId]/roster';
const tokens = '(course)/courses/[courseId]/tokens';

const place = (scene: Scene) => ({ courseId: scene.course.id, membershipId: scene.student.membership.id });

/** A token that may be revoked. */
export async function prepare(scene: Scene): Promise<void> {
  const token = await ApiToken.create({
    courseId: scene.course.id,
    name: 'to be revoked',
    tokenHash: 'a'.repeat(64),
    scopes: ['export-marks'],
    createdBy: scene.instructor.user.id,
    expiresAt: new Date(Date.now() + 1_000_000),
    revokedAt: null,
    lastUsedAt: null,
  });
  scene.extras['roster.token'] = token.id;
}

/** Own courses, and a course's roster, tokens and log. */
export const rows: readonly Row[] = [
  {
    kind: 'page',
    file: '(course)/courses/page.tsx',
    path: paths.courses,
    expect: ['sign-in', 'elsewhere', 'allow', 'allow', 'allow', 'allow', 'allow'],
  },
  {
    kind: 'page',
    file: `${roster}/page.tsx`,
    path: (scene) => paths.roster(scene.course.id),
    expect: ['sign-in', 'refuse', 'allow', 'allow', 'allow', 'allow', 'hide'],
  },
  {
    kind: 'page',
    file: `${roster}/[membershipId]/page.tsx`,
    path: (scene) => paths.rosterPerson(scene.course.id, scene.student.membership.id),
    expect: ['sign-in', 'refuse', 'refuse', 'allow', 'allow', 'allow', 'hide'],
  },
  {
    kind: 'action',
    file: `${roster}/actions.ts`,
    action: 'invitePerson',
    services: ['inviteToCourse'],
    run: (context, scene) =>
      inviteToCourse(context, {
        courseId: scene.course.id,
        email: 'newcomer@wrenfield.example',
        name: 'Nia Brook',
        role: 'student',
        sectionIds: [],
      }),
    expect: ['sign-in', 'refuse', 'refuse', 'allow', 'allow', 'allow', 'hide'],
  },
  {
    kind: 'action',
    file: `${roster}/actions.ts`,
    action: 'addSection',
    services: ['createSection'],
    run: (context, scene) => createSection(context, { courseId: scene.course.id, name: 'Section Z' }),
    expect: ['sign-in', 'refuse', 'refuse', 'allow', 'allow', 'allow', 'hide'],
  },
  {
    kind: 'action',
    file: `${roster}/actions.ts`,
    action: 'savePlace',
    services: ['changeMembership'],
    run: (context, scene) => changeMembership(context, { ...place(scene), role: 'ta', sectionIds: [] }),
    expect: ['sign-in', 'refuse', 'refuse', 'allow', 'allow', 'allow', 'hide'],
  },
  {
    kind: 'action',
    file: `${roster}/actions.ts`,
    action: 'letLeave',
    services: ['endMembership'],
    run: (context, scene) => endMembership(context, place(scene)),
    expect: ['sign-in', 'refuse', 'refuse', 'allow', 'allow', 'allow', 'hide'],
  },
  {
    kind: 'action',
    file: `${roster}/actions.ts`,
    action: 'inviteAgain',
    services: ['resendInvitation'],
    run: (context, scene) => resendInvitation(context, place(scene)),
    expect: ['sign-in', 'refuse', 'refuse', 'allow', 'allow', 'allow', 'hide'],
  },
  {
    kind: 'page',
    file: `${tokens}/page.tsx`,
    path: (scene) => paths.tokens(scene.course.id),
    expect: ['sign-in', 'refuse', 'refuse', 'allow', 'allow', 'refuse', 'hide'],
  },
  {
    kind: 'action',
    file: `${tokens}/actions.ts`,
    action: 'makeToken',
    services: ['createApiToken'],
    run: (context, scene) =>
      createApiToken(context, { courseId: scene.course.id, name: 'marks', scopes: ['export-marks'], days: 1 }),
    expect: ['sign-in', 'refuse', 'refuse', 'allow', 'allow', 'refuse', 'hide'],
  },
  {
    kind: 'action',
    file: `${tokens}/actions.ts`,
    action: 'revokeToken',
    services: ['revokeApiToken'],
    run: (context, scene) =>
      revokeApiToken(context, { courseId: scene.course.id, tokenId: scene.extras['roster.token'] ?? '' }),
    expect: ['sign-in', 'refuse', 'refuse', 'allow', 'allow', 'refuse', 'hide'],
  },
  {
    kind: 'page',
    file: '(course)/courses/[courseId]/log/page.tsx',
    path: (scene) => paths.log(scene.course.id),
    expect: ['sign-in', 'refuse', 'refuse', 'refuse', 'allow', 'allow', 'hide'],
  },
];
