import { mergeAttributes, Node } from '@tiptap/core';
import { NodeViewWrapper, ReactNodeViewRenderer, type NodeViewProps } from '@tiptap/react';
import { useQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { Quantity } from '#src/ui/quantity.tsx';
import { joinClasses } from '#src/ui/join-classes.ts';
import { boundValuesOf } from '../api.ts';

type BoundValueOptions = { number: string; onBind: () => void };

declare module '@tiptap/core' {
  interface Commands<ReturnType> {
    boundValue: {
      /** Puts a bound value where the caret is. */
      insertBoundValue: (bindingId: string) => ReturnType;
      /** Puts one binding in the place of another, wherever it stands in the text. */
      replaceBoundValue: (from: string, to: string) => ReturnType;
    };
  }
}

/** A value in the text: it holds which binding it is and nothing else, so no number can be typed or pasted into it. */
export const BoundValue = Node.create<BoundValueOptions>({
  name: 'boundValue',
  group: 'inline',
  inline: true,
  atom: true,
  addOptions: () => ({ number: '', onBind: () => undefined }),
  addAttributes: () => ({
    bindingId: {
      default: '',
      parseHTML: (element) => element.getAttribute('data-binding'),
      renderHTML: ({ bindingId }) => ({ 'data-binding': String(bindingId) }),
    },
  }),
  parseHTML: () => [{ tag: 'span[data-binding]' }],
  renderHTML: ({ HTMLAttributes }) => ['span', mergeAttributes(HTMLAttributes)],
  addNodeView: () => ReactNodeViewRenderer(BoundValueInText, { as: 'span' }),
  addKeyboardShortcuts() {
    return {
      'Mod-k': () => {
        if (!this.editor.isEditable) return false;
        this.options.onBind();
        return true;
      },
    };
  },
  addCommands() {
    return {
      insertBoundValue:
        (bindingId) =>
        ({ commands }) =>
          commands.insertContent({ type: this.name, attrs: { bindingId } }),
      replaceBoundValue:
        (from, to) =>
        ({ tr, dispatch }) => {
          tr.doc.descendants((node, at) => {
            if (node.type.name === this.name && node.attrs.bindingId === from && dispatch)
              tr.setNodeAttribute(at, 'bindingId', to);
          });
          return true;
        },
    };
  },
});

function BoundValueInText({ node, extension, selected }: NodeViewProps) {
  const options: BoundValueOptions = extension.options;
  const navigate = useNavigate();
  const { data, isPending } = useQuery(boundValuesOf(options.number));
  const value = data?.find((each) => each.id === node.attrs.bindingId);
  if (!value) {
    return (
      <NodeViewWrapper as="span" className="bound-value is-unknown">
        {isPending ? 'reading…' : 'not in this case'}
      </NodeViewWrapper>
    );
  }
  const lineage = `${value.words}: ${value.sourceWords}${value.stale ? `. Stale: ${value.stale.why}` : ''}`;
  return (
    <NodeViewWrapper
      as="span"
      className={joinClasses('bound-value', value.stale && 'is-stale', selected && 'is-selected')}
    >
      <a
        href={value.href}
        title={lineage}
        aria-label={`${value.text}. ${lineage}`}
        onClick={(event) => {
          event.preventDefault();
          if (!selected && event.detail > 0 && !event.ctrlKey && !event.metaKey) return;
          void navigate(value.href);
        }}
      >
        <Quantity {...value.parts} />
      </a>
    </NodeViewWrapper>
  );
}
