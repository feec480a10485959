'use client';

import { useState } from 'react';
import { Field } from '@/components/ui/fields';
import { type TemplateDraft } from '@/lib/templates/draft';
import { DraftArea, DraftField, SourceGroup } from './draft-fields';

interface QuestionFieldsProps {
  readonly draft: TemplateDraft;
  readonly topics: readonly string[];
  readonly change: (next: Partial<TemplateDraft>) => void;
  readonly changeTopics: (topics: string[]) => void;
}

/** Title, topics, prompt and solution note. */
export function QuestionFields({ draft, topics, change, changeTopics }: QuestionFieldsProps) {
  const [typed, setTyped] = useState(topics.join(', '));
  return (
    <SourceGroup title="Question">
      <DraftField
        path="title"
        label="Title"
        value={draft.title}
        onText={(title) => change({ title })}
        maxLength={200}
      />
      <Field
        name="topics"
        label="Topics"
        hint="Between commas; the shelf is searched by them."
        optional
        value={typed}
        onChange={(event) => {
          setTyped(event.target.value);
          changeTopics(topicsOf(event.target.value));
        }}
        autoComplete="off"
      />
      <DraftArea
        path="prompt"
        label="Prompt"
        hint={
          <>
            Markdown with TeX between dollar signs. <code>{'{{n}}'}</code> sets the drawn value of n.
          </>
        }
        mono
        rows={5}
        value={draft.prompt}
        onText={(prompt) => change({ prompt })}
      />
      <DraftArea
        path="solution"
        label="Solution note"
        hint="For graders; students see it after release, where the set says so."
        optional
        mono
        rows={2}
        value={draft.solution}
        onText={(solution) => change({ solution })}
      />
    </SourceGroup>
  );
}

function topicsOf(typed: string): string[] {
  const topics = typed
    .split(',')
    .map((topic) => topic.trim().slice(0, 40))
    .filter(Boolean);
  return [...new Set(topics)].slice(0, 30);
}
