import { QueryTypes } from 'sequelize';
import { type TokenActor } from '@/lib/domain/actor';
import { courseRoles } from '@/lib/domain/roles';
import { grantOf } from '@/lib/domain/permissions';
import { database } from '@/lib/db/connection';
import { hashOpaqueToken } from './opaque-token';

/** What every API token begins with, so that a leaked one is recognised. */
export const apiTokenPrefix = 'halfmark_';

const bearer = /^Bearer +(halfmark_[A-Za-z0-9_-]{43})$/i;

/** Roles whose tokens work: those who may make them. */
const makerRoles = courseRoles.filter((role) => grantOf(role, 'manage-tokens') !== null);

/**
 * The caller behind an `Authorization: Bearer` header; null when there is no such header or the token is unknown, has
 * expired or was revoked. A token stops working with its maker: when they leave the course, lose the role that lets them
 * make tokens, or are deactivated.
 */
export async function actorFromBearer(request: { headers: Headers }, now = new Date()): Promise<TokenActor | null> {
  const token = bearer.exec(request.headers.get('authorization') ?? '')?.[1];
  if (token === undefined) return null;
  const rows = await database().query<{ id: string; course_id: string; scopes: string[] }>(
    `update api_tokens t set last_used_at = :now
       from memberships m join users u on u.id = m.user_id
      where t.token_hash = :hash and t.revoked_at is null and t.expires_at > :now
        and m.user_id = t.created_by and m.course_id = t.course_id and m.left_at is null and m.role in (:makerRoles)
        and u.deactivated_at is null
     returning t.id, t.course_id, t.scopes`,
    { type: QueryTypes.SELECT, replacements: { hash: hashOpaqueToken(token), now, makerRoles } },
  );
  const row = rows[0];
  return row === undefined ? null : { kind: 'token', tokenId: row.id, courseId: row.course_id, scopes: row.scopes };
}
