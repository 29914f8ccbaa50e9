import { useState } from 'react';
import type { EvidenceView } from '#shared/contracts/evidence.ts';
import { formatDay } from '#shared/wording/dates.ts';
import { Button } from '#src/ui/button.tsx';
import { EmptyState } from '#src/ui/empty-state.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { ChangePieceForm } from './change-piece-form.tsx';
import { NoteMissingForm } from './note-missing-form.tsx';
import { PairFacesForm } from './pair-faces-form.tsx';
import { PartForm, type MaterialOffered } from './part-form.tsx';
import { PiecesHint } from './pieces-hint.tsx';
import { PiecesTable } from './pieces-table.tsx';
import { ReceivePieceForm } from './receive-piece-form.tsx';

type PiecesPageProps = {
  number: string;
  evidence: EvidenceView;
  materials: readonly MaterialOffered[];
  /** Who receives pieces, as their first holder. */
  holder: string;
  today: string;
};

type OpenForm = 'part' | 'receive' | 'missing' | 'pair' | { pieceId: string };

/** The right page of the chapter: every piece, and the acts on them. */
export function PiecesPage(props: PiecesPageProps) {
  const { number, evidence, materials } = props;
  const [open, setOpen] = useState<OpenForm | null>(null);
  const leave = () => setOpen(null);
  const { parts, pieces, change } = evidence;
  if (parts.length === 0 && open === 'part') return <PartForm number={number} materials={materials} onDone={leave} />;
  if (parts.length === 0) return <NoPartYet evidence={evidence} onEnter={() => setOpen('part')} />;
  const openId = open !== null && typeof open === 'object' ? open.pieceId : null;
  return (
    <>
      <RuleHead aside="every piece in one place, with one holder">Pieces</RuleHead>
      <PiecesTable
        parts={parts}
        pieces={pieces}
        openId={openId}
        onOpen={change.allowed ? ({ id }) => setOpen({ pieceId: id }) : undefined}
      />
      {change.allowed ? null : <WhyNot evidence={evidence} />}
      {change.allowed && open === null ? <Acts evidence={evidence} onOpen={setOpen} /> : null}
      {change.allowed && open !== null ? <OpenedForm {...props} open={open} onDone={leave} /> : null}
    </>
  );
}

function OpenedForm({ number, evidence, materials, holder, today, open, onDone }: OpenedFormProps) {
  const { parts, pieces } = evidence;
  if (open === 'part') return <PartForm number={number} materials={materials} onDone={onDone} />;
  if (open === 'receive') return <ReceivePieceForm {...{ number, parts, pieces, holder, today, onDone }} />;
  if (open === 'missing') return <NoteMissingForm {...{ number, parts, onDone }} />;
  if (open === 'pair') return <PairFacesForm {...{ number, pieces, onDone }} />;
  const piece = pieces.find(({ id }) => id === open.pieceId);
  return piece ? <ChangePieceForm key={piece.id} {...{ number, piece, onDone }} /> : null;
}
type OpenedFormProps = PiecesPageProps & { open: OpenForm; onDone: () => void };

function Acts({ evidence, onOpen }: { evidence: EvidenceView; onOpen: (form: OpenForm) => void }) {
  const canPair = evidence.pieces.length >= 2;
  return (
    <div className="acts mt-3 narrow:flex-col narrow:items-stretch">
      <Button kind="main" onClick={() => onOpen('receive')}>
        Receive a piece
      </Button>
      <Button onClick={() => onOpen('missing')}>Note what is missing</Button>
      {canPair ? <Button onClick={() => onOpen('pair')}>Pair mating faces</Button> : null}
      <Button kind="plain" onClick={() => onOpen('part')}>
        Enter another part
      </Button>
    </div>
  );
}

function NoPartYet({ evidence, onEnter }: { evidence: EvidenceView; onEnter: () => void }) {
  return (
    <>
      <RuleHead>Pieces</RuleHead>
      <EmptyState
        hint={<PiecesHint />}
        acts={
          evidence.change.allowed ? (
            <Button kind="main" onClick={onEnter}>
              Enter the part
            </Button>
          ) : null
        }
      >
        {evidence.change.allowed
          ? 'Say what broke; its pieces then get their numbers one by one.'
          : 'No part has been entered in this case.'}
      </EmptyState>
      {evidence.change.allowed ? null : <WhyNot evidence={evidence} />}
    </>
  );
}

function WhyNot({ evidence }: { evidence: EvidenceView }) {
  const words = evidence.closedAt
    ? `Sealed since ${formatDay(evidence.closedAt)}; the pieces change only by amendment.`
    : evidence.change.reason;
  return <p className="mt-3 text-s text-ink-2">{words}</p>;
}
