import { requireActor } from '@/app/_server/current-actor';
import { idsOf, pageOf } from '@/app/_server/page';
import { ClosedSet } from './_components/closed-set';
import { KeeperProvider } from './_components/keeper-context';
import { OpenSet } from './_components/open-set';
import { SavedStatus } from './_components/saved-status';
import { SetHead } from './_components/set-head';
import { loadOwnWork } from './load-own-work';

type Props = { params: Promise<{ setId: string }> };

export async function generateMetadata({ params }: Props) {
  const actor = await requireActor();
  const { setId } = await idsOf(params);
  const set = await pageOf(() => loadOwnWork(actor, setId));
  return { title: `Set ${set.number}, ${set.title}` };
}

/** A student's set: their own questions, and the fields to answer them in while it is open. */
export default async function WorkSetPage({ params }: Props) {
  const actor = await requireActor();
  const { setId } = await idsOf(params);
  const set = await pageOf(() => loadOwnWork(actor, setId));
  if (!set.takesAnswers) {
    return (
      <>
        <SetHead actor={actor} set={set} />
        <ClosedSet set={set} />
      </>
    );
  }
  const parts = set.questions.flatMap(({ drawId, parts }) =>
    parts.map(({ key, unsent, handedIn, revision }) => ({
      drawId,
      partKey: key,
      text: unsent ?? handedIn?.text ?? '',
      revision,
    })),
  );
  return (
    <KeeperProvider parts={parts} closesAt={set.closesAt}>
      <SetHead actor={actor} set={set} saved={<SavedStatus />} />
      <OpenSet set={set} />
    </KeeperProvider>
  );
}
