'use client';

import { Progress } from '@/components/ui/progress';
import { type TemplateDraft } from '@/lib/templates/draft';
import { type TemplateProblem } from '@/lib/templates/template-problem';
import { ConditionFields } from './condition-fields';
import { ParameterFields } from './parameter-fields';
import { PartFields } from './part-fields';
import { ProblemContext } from './problem-context';
import { PublishButton } from './publish-button';
import { QuestionFields } from './question-fields';
import { type RenderedPreview } from './render-preview';
import { Result } from './result';
import { SaveLine } from './save-line';
import { SlipContext, type SlipWords } from './slip-words';
import { SymbolFields } from './symbol-fields';
import { useDraft } from './use-draft';

export interface TemplateEditorProps {
  readonly templateId: string;
  readonly revision: number;
  readonly draft: TemplateDraft;
  readonly topics: string[];
  readonly mayWrite: boolean;
  /** The number that the next published version will have. */
  readonly nextNumber: number;
  /** What the draft makes, which comes after the fields so that nobody waits for it to begin writing. */
  readonly preview: Promise<RenderedPreview>;
  /** The catalogue of slips that may be given credit. */
  readonly slips: readonly SlipWords[];
}

/** Source at the left, what it makes at the right; kept as it is typed. */
export function TemplateEditor({ templateId, mayWrite, nextNumber, slips, ...initial }: TemplateEditorProps) {
  const state = useDraft(templateId, initial);
  const { draft, change, preview } = state;
  const problems = preview?.problems ?? [];
  const mistakes = problems.filter(isMistake);
  return (
    <ProblemContext value={problems}>
      <div className="grid gap-x-10 lg:grid-cols-2">
        <fieldset disabled={!mayWrite} className="grid min-w-0 content-start gap-9">
          <legend className="sr-only">The question’s source</legend>
          {mayWrite ? null : (
            <p className="text-small text-grey">You may read this question; instructors of its department change it.</p>
          )}
          <QuestionFields draft={draft} topics={state.topics} change={change} changeTopics={state.changeTopics} />
          <ParameterFields parameters={draft.parameters} change={(parameters) => change({ parameters })} />
          <SymbolFields symbols={draft.symbols} change={(symbols) => change({ symbols })} />
          <ConditionFields constraints={draft.constraints} change={(constraints) => change({ constraints })} />
          <SlipContext value={slips}>
            <PartFields parts={draft.parts} change={(parts) => change({ parts })} />
          </SlipContext>
        </fieldset>
        <div className="mt-10 min-w-0 border-margin-line lg:mt-0 lg:border-l-2 lg:pl-8">
          <div className="grid gap-6 lg:sticky lg:top-4 lg:max-h-[calc(100dvh-2rem)] lg:overflow-y-auto lg:pr-1">
            {mayWrite ? (
              <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
                <SaveLine status={state.status} />
                <PublishButton
                  templateId={templateId}
                  revision={state.revision}
                  nextNumber={nextNumber}
                  ready={preview !== null && state.status.is === 'saved' && mistakes.length === 0}
                  mistakes={mistakes.length}
                />
              </div>
            ) : null}
            {preview === null ? (
              <Progress label="Working three draws out" />
            ) : (
              <Result preview={preview} stale={state.status.is !== 'saved'} />
            )}
          </div>
        </div>
      </div>
    </ProblemContext>
  );
}

function isMistake(problem: TemplateProblem): boolean {
  return problem.weight === 'mistake';
}
