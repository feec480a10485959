import { ActionButton } from '@/app/_components/action-button';
import { DataTable } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/states';
import { TimeStamp } from '@/components/ui/time-stamp';
import { tokenScopeSentence } from '@/lib/domain/token-scopes';
import { type TokenInList } from '@/lib/queries/api-tokens';
import { revokeToken } from '../actions';

type Props = { courseId: string; tokens: readonly TokenInList[]; zone: string };

/** The tokens of a course; a good one can be ended here. */
export function TokenTable({ courseId, tokens, zone }: Props) {
  const rows = tokens.map((token) => ({
    id: token.id,
    cells: {
      name: token.name,
      may: token.scopes.map(tokenScopeSentence).join('; '),
      by: token.madeBy,
      ends: moment(token.expiresAt, zone),
      used: token.lastUsedAt === null ? { value: null, text: 'never' } : moment(token.lastUsedAt, zone),
      state: {
        value: token.state,
        node: token.state === 'good' ? <Revoke courseId={courseId} token={token} /> : token.state,
      },
    },
  }));
  return (
    <DataTable
      caption="Tokens"
      columns={columns}
      rows={rows}
      filterLabel={rows.length > 8 ? 'Filter' : null}
      empty={
        <EmptyState title="No tokens yet.">
          A token lets a program of yours use this course’s data without anybody’s password.
        </EmptyState>
      }
    />
  );
}

function Revoke({ courseId, token }: { courseId: string; token: TokenInList }) {
  return (
    <ActionButton
      action={revokeToken}
      fields={{ courseId, tokenId: token.id }}
      label="Revoke"
      look="plain"
      done="The token is revoked."
      confirm={{ title: `Revoke “${token.name}”`, words: 'Programs that use it are refused from now on, for good.' }}
    />
  );
}

function moment(at: Date, zone: string) {
  return { value: at.getTime(), text: at.toISOString(), node: <TimeStamp at={at} zone={zone} style="short" /> };
}

const columns = [
  { key: 'name', label: 'For', heading: true },
  { key: 'may', label: 'May' },
  { key: 'by', label: 'Made by' },
  { key: 'ends', label: 'Ends' },
  { key: 'used', label: 'Last used' },
  { key: 'state', label: 'State', sortable: false },
] as const;
