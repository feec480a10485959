import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';
import type { IntakeState } from '@/models/intake';

/** An upload of a set, newest first. */
export type IntakeLine = {
  id: string;
  fileName: string;
  state: IntakeState;
  rowsTotal: number;
  rowsAccepted: number;
  rowsRefused: number;
  rowsChecked: number;
  uploadedBy: string;
  uploaderName: string;
  at: Date;
};

/** The uploads of a set; of one uploader only where `uploaderId` is given. */
export async function intakesOfSet(problemSetId: string, uploaderId: string | null): Promise<IntakeLine[]> {
  return database().query<IntakeLine>(
    `select i.id, f.original_name as "fileName", i.state, i.rows_total as "rowsTotal",
            i.rows_accepted as "rowsAccepted", i.rows_refused as "rowsRefused", i.rows_checked as "rowsChecked",
            i.uploaded_by as "uploadedBy", u.name as "uploaderName", i.created_at as at
       from intakes i
       join stored_files f on f.id = i.stored_file_id
       join users u on u.id = i.uploaded_by
      where i.problem_set_id = :problemSetId and (:uploaderId::uuid is null or i.uploaded_by = :uploaderId::uuid)
      order by i.created_at desc
      limit 200`,
    { type: QueryTypes.SELECT, replacements: { problemSetId, uploaderId } },
  );
}
