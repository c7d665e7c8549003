import { pathText } from '../../src/scenario/entries/pathText.ts';
import type { FormNode, ListNode, SectionNode } from '../model/formNode.ts';
import { act, words } from '../sheet.ts';
import { Field, Problems } from './Field.tsx';
import { Fold } from './Fold.tsx';
import { fieldId } from './fieldId.ts';

/** Entries in their order; those that may be left out and are seldom asked for stand behind a fold. */
export function Nodes({ nodes }: { readonly nodes: readonly FormNode[] }) {
  const folded = nodes.filter((node) => node.folded);
  return (
    <>
      <div class="fields">
        {nodes
          .filter((node) => !node.folded)
          .map((node) => (
            <Node key={pathText(node.path)} node={node} />
          ))}
      </div>
      {folded.length > 0 && (
        <Fold name={words.value.more} wrong={folded.some(hasProblem)}>
          <div class="fields">
            {folded.map((node) => (
              <Node key={pathText(node.path)} node={node} />
            ))}
          </div>
        </Fold>
      )}
    </>
  );
}

/** Whether something in an entry has to be put right. */
export function hasProblem(node: FormNode): boolean {
  if (node.problems.some(({ severity }) => severity === 'error')) return true;
  if (node.kind === 'field') return false;
  return node.kind === 'section'
    ? node.children.some(hasProblem)
    : node.items.some((item) => item.children.some(hasProblem));
}

function Node({ node }: { readonly node: FormNode }) {
  if (node.kind === 'field') return <Field node={node} />;
  return node.kind === 'section' ? <Section node={node} /> : <List node={node} />;
}

function Section({ node }: { readonly node: SectionNode }) {
  const said = words.value;
  const { file, path, label, says, present, optional, children, problems } = node;
  if (!present) {
    return (
      <div class="section absent" id={fieldId(file, path)} tabIndex={-1}>
        <button type="button" onClick={() => act({ do: 'add', file, path })}>
          {said.add(label)}
        </button>{' '}
        <span class="says">{says}</span>
        <Problems problems={problems} />
      </div>
    );
  }
  return (
    <fieldset class={path.length === 1 ? 'section whole' : 'section'} id={fieldId(file, path)} tabIndex={-1}>
      <legend>{label}</legend>
      <p class="says">{says}</p>
      <Problems problems={problems} />
      <Nodes nodes={children} />
      {optional && (
        <button type="button" class="quiet" onClick={() => act({ do: 'remove', file, path })}>
          {said.remove(label)}
        </button>
      )}
    </fieldset>
  );
}

function List({ node }: { readonly node: ListNode }) {
  const said = words.value;
  const { file, path, label, says, items, problems } = node;
  return (
    <fieldset class="section" id={fieldId(file, path)} tabIndex={-1}>
      <legend>{label}</legend>
      <p class="says">{says}</p>
      <Problems problems={problems} />
      {items.map((item, i) => (
        <fieldset class="item" key={pathText(item.path)}>
          <legend>{`${label} ${i + 1}`}</legend>
          <Nodes nodes={item.children} />
          <button type="button" class="quiet" onClick={() => act({ do: 'remove', file, path: item.path })}>
            {said.remove(`${label} ${i + 1}`)}
          </button>
        </fieldset>
      ))}
      <button type="button" onClick={() => act({ do: 'add', file, path })}>
        {said.add(label)}
      </button>
    </fieldset>
  );
}
