import { useState } from 'preact/hooks';
import type { FieldNode, Told } from '../model/formNode.ts';
import { act, words } from '../sheet.ts';
import { fieldId } from './fieldId.ts';

/** One entry: its label, the field, what the schema says, and what is wrong with it. */
export function Field({ node }: { readonly node: FieldNode }) {
  const id = fieldId(node.file, node.path);
  const wrong = node.problems.some(({ severity }) => severity === 'error');
  return (
    <div class={wrong ? 'field wrong' : 'field'}>
      <label for={id}>
        {node.label}
        {node.unit !== undefined && <span class="unit"> {node.unit}</span>}
      </label>
      {node.choices !== undefined || node.input === 'truth' ? (
        <Choice node={node} id={id} wrong={wrong} />
      ) : (
        <Typed node={node} id={id} wrong={wrong} />
      )}
      <p class="says" id={`${id}-says`}>
        <span>{node.says}</span> <Range node={node} />
      </p>
      <Problems id={`${id}-wrong`} problems={node.problems} />
    </div>
  );
}

interface Of {
  readonly node: FieldNode;
  readonly id: string;
  readonly wrong: boolean;
}

/** While it has the focus the field shows what is typed; else what stands in the file. */
function Typed({ node, id, wrong }: Of) {
  const [typed, setTyped] = useState<string | undefined>(undefined);
  const write = (text: string) => {
    setTyped(text);
    act({ do: 'write', file: node.file, path: node.path, text, input: node.input });
  };
  return (
    <input
      id={id}
      type="text"
      inputMode={node.input === 'number' ? 'decimal' : 'text'}
      class={node.input === 'number' ? 'figure' : undefined}
      autocomplete="off"
      spellcheck={false}
      value={typed ?? node.written}
      placeholder={node.assumed}
      aria-describedby={`${id}-says ${id}-wrong`}
      aria-invalid={wrong}
      onInput={(event) => write(event.currentTarget.value)}
      onBlur={() => setTyped(undefined)}
    />
  );
}

function Choice({ node, id, wrong }: Of) {
  const said = words.value;
  const choices = node.choices ?? [
    { value: 'true', label: said.yes },
    { value: 'false', label: said.no },
  ];
  const known = choices.some(({ value }) => value === node.written);
  const choose = (value: string) => {
    const { file, path, input } = node;
    if (node.setsForm) act({ do: 'form', file, path, choice: value });
    else act({ do: 'write', file, path, text: value, input });
  };
  return (
    <select
      id={id}
      aria-describedby={`${id}-says ${id}-wrong`}
      aria-invalid={wrong}
      value={node.written}
      onChange={(event) => choose(event.currentTarget.value)}
    >
      {(!known || !node.required) && (
        <option value={known ? '' : node.written}>
          {known || node.written === '' ? unchosen(node) : node.written}
        </option>
      )}
      {choices.map(({ value, label }) => (
        <option key={value} value={value}>
          {label}
        </option>
      ))}
    </select>
  );
}

/** What a choice shows as long as nothing is chosen. */
function unchosen({ assumed, required }: FieldNode): string {
  const said = words.value;
  if (assumed !== undefined) return said.assumed(assumed);
  return required ? said.choose : said.nothing;
}

function Range({ node }: { readonly node: FieldNode }) {
  const said = words.value;
  const parts = [
    ...(node.usual === undefined ? [] : [said.usual(node.usual)]),
    ...(node.written !== '' || node.required
      ? []
      : [node.assumed === undefined ? said.leftOut : said.assumed(node.assumed)]),
  ];
  return parts.length === 0 ? null : <span class="range">({parts.join('; ')})</span>;
}

/** What is wrong or odd at a place, with its cure. */
export function Problems({ id, problems }: { readonly id?: string; readonly problems: readonly Told[] }) {
  return (
    <div id={id} class="told">
      {problems.map(({ severity, says, cure, path }) => (
        <p key={path + says} class={severity}>
          <bdi>{says}</bdi> <span class="cure">→ {cure}</span>
        </p>
      ))}
    </div>
  );
}
