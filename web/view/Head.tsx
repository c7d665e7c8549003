import { chosenFiles } from '../droppedFiles.ts';
import type { SaveKind } from '../model/sheetSaves.ts';
import {
  chooseScenario,
  draft,
  fault,
  goBack,
  isDemo,
  language,
  left,
  refused,
  save,
  showDemo,
  speak,
  startBlank,
  state,
  takeFiles,
  unreadable,
  wipeDraft,
  words,
} from '../sheet.ts';

/** What this is, where it begins, and how files come in and go out. */
export function Head() {
  const said = words.value;
  return (
    <header>
      <a class="skip" href="#answer">
        {said.skip}
      </a>
      <div class="top">
        <h1>
          Winterledger <span>{said.title}</span>
        </h1>
        <label class="language">
          {said.language}
          <select value={language.value} onChange={(event) => speak(event.currentTarget.value === 'de' ? 'de' : 'en')}>
            <option value="en">English</option>
            <option value="de">Deutsch</option>
          </select>
        </label>
      </div>
      {isDemo.value && <p class="invented">{said.invented}</p>}
      <div class="doors">
        <button type="button" onClick={startBlank}>
          {said.blank}
        </button>
        <Opener name={said.open} />
        <Opener name={said.openFolder} folder />
        {left.value !== undefined && (
          <button type="button" class="quiet" onClick={goBack}>
            {said.back}
          </button>
        )}
        {!isDemo.value && (
          <button type="button" class="quiet" onClick={showDemo}>
            {said.demo}
          </button>
        )}
      </div>
      <Scenarios />
      <p class="says">
        {said.drop} {said.stays}
      </p>
      {refused.value.length > 0 && <p class="error">{said.refused(refused.value.join(', '))}</p>}
      {unreadable.value && (
        <p class="error" role="alert">
          {said.unreadable}
        </p>
      )}
      {fault.value !== undefined && (
        <p class="error" role="alert">
          {said.fault} {fault.value}
        </p>
      )}
    </header>
  );
}

/** The choice among several scenarios of one folder. */
function Scenarios() {
  const { scenario = '', scenarios = [] } = state.value ?? {};
  if (scenarios.length < 2) return null;
  return (
    <p class="scenarios">
      <label>
        {words.value.scenarios}{' '}
        <select value={scenario} onChange={(event) => chooseScenario(event.currentTarget.value)}>
          {scenarios.map((name) => (
            <option key={name}>{name}</option>
          ))}
        </select>
      </label>
    </p>
  );
}

function Opener({ name, folder = false }: { readonly name: string; readonly folder?: boolean }) {
  return (
    <label class="button">
      {name}
      <input
        type="file"
        class="hidden"
        multiple
        {...(folder ? { webkitdirectory: true } : {})}
        onChange={(event) => {
          const field = event.currentTarget;
          void chosenFiles(field.files).then((files) => {
            takeFiles(files);
            field.value = '';
          });
        }}
      />
    </label>
  );
}

/** What can be saved, which files there are, and what this browser keeps. */
export function Foot() {
  const said = words.value;
  const now = state.value;
  if (now === undefined) return null;
  const needsAnswer: readonly SaveKind[] = ['result', 'hours', 'report'];
  return (
    <footer>
      <h2>{said.save}</h2>
      <p class="doors">
        {(Object.keys(said.saves) as SaveKind[]).map((kind) => (
          <button
            type="button"
            key={kind}
            disabled={needsAnswer.includes(kind) && now.answer === undefined}
            onClick={() => save(kind)}
          >
            {said.saves[kind]}
          </button>
        ))}
      </p>
      <p class="says">{said.savesSay}</p>
      <h3>{said.files}</h3>
      <ul class="small">
        {now.files.map(({ name, size, changed }) => (
          <li key={name}>
            <bdi>{name}</bdi>, {Math.max(1, Math.round(size / 1000))} kB{changed && ` (${said.changed})`}
          </li>
        ))}
      </ul>
      <p class="says">
        {draft.value === 'full' ? said.draftFull : draft.value === 'kept' ? said.draft : said.draftNone}{' '}
        {draft.value === 'kept' && (
          <>
            <button type="button" class="quiet" aria-describedby="draft-says" onClick={wipeDraft}>
              {said.draftWipe}
            </button>{' '}
            <span id="draft-says">{said.draftSays}</span>
          </>
        )}
      </p>
    </footer>
  );
}
