import { BlochSphere } from '@/components/math/bloch-sphere';
import { LevelDiagram } from '@/components/math/level-diagram';
import { PauliBars } from '@/components/math/pauli-bars';
import { Section } from '@/components/ui/script-page';
import { type Figures } from './figures-of-pair';

/** Reference against answer as a picture, at the values said beside it. */
export function Pictures({ figures }: { figures: Figures }) {
  const { picture, at } = figures;
  return (
    <Section label="Picture" margin={at ? <p className="text-small text-grey">Drawn at {at}, with ħ = 1.</p> : null}>
      {picture.kind === 'bloch' ? <BlochSphere reference={picture.reference} answer={picture.answer} /> : null}
      {picture.kind === 'levels' ? <LevelDiagram reference={picture.reference} answer={picture.answer} /> : null}
      {picture.kind === 'pauli' ? <PauliBars reference={picture.reference} answer={picture.answer} /> : null}
    </Section>
  );
}
