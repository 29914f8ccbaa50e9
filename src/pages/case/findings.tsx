import { useParams } from 'react-router-dom';
import { FindingsSpread } from '#src/features/findings/components/findings-spread.tsx';
import { usePerson } from '#src/http/session.ts';
import '#src/theme/findings.css';
import { useCase } from './case-context.ts';

/** Chapter vi: the findings, written together. */
export function Component() {
  const { number = '' } = useParams();
  const person = usePerson();
  const { acts } = useCase();
  return <FindingsSpread key={number} number={number} person={person} mayWrite={acts['write findings']} />;
}
