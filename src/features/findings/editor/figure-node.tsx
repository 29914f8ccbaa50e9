import { mergeAttributes, Node } from '@tiptap/core';
import { NodeViewWrapper, ReactNodeViewRenderer, type NodeViewProps } from '@tiptap/react';
import { useQuery } from '@tanstack/react-query';
import { FigureCaption } from '#src/ui/figure-caption.tsx';
import { joinClasses } from '#src/ui/join-classes.ts';
import { figureAddress, figuresOf } from '../api.ts';

type FigureOptions = { number: string };

declare module '@tiptap/core' {
  interface Commands<ReturnType> {
    figure: {
      insertFigure: (figureId: string) => ReturnType;
      /** Puts a figure drawn again in the place of the old one. */
      replaceFigure: (from: string, to: string) => ReturnType;
    };
  }
}

/** A figure in the text: it holds which record it is; picture, marks, number and caption come from that. */
export const Figure = Node.create<FigureOptions>({
  name: 'figure',
  group: 'block',
  atom: true,
  draggable: true,
  addOptions: () => ({ number: '' }),
  addAttributes: () => ({
    figureId: {
      default: '',
      parseHTML: (element) => element.getAttribute('data-figure'),
      renderHTML: ({ figureId }) => ({ 'data-figure': String(figureId) }),
    },
  }),
  parseHTML: () => [{ tag: 'figure[data-figure]' }],
  renderHTML: ({ HTMLAttributes }) => ['figure', mergeAttributes(HTMLAttributes)],
  addNodeView: () => ReactNodeViewRenderer(FigureInText),
  addCommands() {
    return {
      insertFigure:
        (figureId) =>
        ({ commands }) =>
          commands.insertContent([{ type: this.name, attrs: { figureId } }, { type: 'paragraph' }]),
      replaceFigure:
        (from, to) =>
        ({ tr, dispatch }) => {
          tr.doc.descendants((node, at) => {
            if (node.type.name === this.name && node.attrs.figureId === from && dispatch)
              tr.setNodeAttribute(at, 'figureId', to);
          });
          return true;
        },
    };
  },
});

function FigureInText({ node, extension, selected }: NodeViewProps) {
  const options: FigureOptions = extension.options;
  const { data, isPending } = useQuery(figuresOf(options.number));
  const figure = data?.find((each) => each.id === node.attrs.figureId);
  if (!figure) {
    return (
      <NodeViewWrapper className="findings-figure">
        <p className="text-ink-2">{isPending ? 'Reading the figure…' : 'This figure is not in this case.'}</p>
      </NodeViewWrapper>
    );
  }
  const { id, figureNumber, caption, widthPx, heightPx, stale } = figure;
  return (
    <NodeViewWrapper
      as="figure"
      className={joinClasses('findings-figure', stale && 'is-stale', selected && 'is-selected')}
    >
      <img
        src={figureAddress(options.number, id)}
        width={widthPx}
        height={heightPx}
        alt={`Fig. ${figureNumber}: ${caption}`}
        draggable={false}
      />
      <FigureCaption number={`Fig. ${figureNumber}`}>{caption}</FigureCaption>
    </NodeViewWrapper>
  );
}
