import { type CourseRole } from '@/lib/domain/roles';
import { HalfmarkError } from '@/lib/errors';
import { type Membership } from '@/models/membership';
import { Section } from '@/models/section';
import { SectionGrader } from '@/models/section-grader';
import { type ServiceContext } from './context';

/**
 * Gives a membership its role and its sections: one at most for a student, any number that a TA grades, none for others
 * (who see all). Sections of another course are not there. For other services; it authorises nothing.
 *
 * @throws HalfmarkError `invalid`
 */
export async function placeInSections(
  context: ServiceContext,
  membership: Membership,
  place: { role: CourseRole; sectionIds: readonly string[] },
): Promise<void> {
  const { transaction } = context;
  const wanted = place.role === 'student' || place.role === 'ta' ? [...new Set(place.sectionIds)] : [];
  if (place.role === 'student' && wanted.length > 1) throw badSections('A student is in one section at most.');
  const { courseId } = membership;
  const known = wanted.length === 0 ? 0 : await Section.count({ where: { id: wanted, courseId }, transaction });
  if (known !== wanted.length) throw badSections('One of these sections is not in this course. Reload the page.');
  const sectionId = place.role === 'student' ? (wanted[0] ?? null) : null;
  await membership.update({ role: place.role, sectionId }, { transaction });
  await SectionGrader.destroy({ where: { membershipId: membership.id }, transaction });
  if (place.role !== 'ta') return;
  await SectionGrader.bulkCreate(
    wanted.map((id) => ({ courseId, sectionId: id, membershipId: membership.id, createdAt: context.now })),
    { transaction },
  );
}

function badSections(message: string): HalfmarkError {
  return new HalfmarkError('invalid', message, { fields: { sectionIds: message } });
}
