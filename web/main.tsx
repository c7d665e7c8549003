import { signal } from '@preact/signals';
import { render } from 'preact';
import { droppedFiles } from './droppedFiles.ts';
import { begin, opened, takeDropped, words } from './sheet.ts';
import './sheet.css';
import { AnswerPane, Shortcut } from './view/Answer.tsx';
import { Foot, Head } from './view/Head.tsx';
import { Parts } from './view/Parts.tsx';

const dragging = signal(false);

function Sheet() {
  return (
    <>
      <Head />
      <main>
        <Parts key={opened.value} />
        <AnswerPane />
      </main>
      <Foot />
      <Shortcut />
      {dragging.value && <div class="dropping">{words.value.dropHere}</div>}
    </>
  );
}

window.addEventListener('dragover', (event) => {
  event.preventDefault();
  dragging.value = true;
});
window.addEventListener('dragleave', (event) => {
  if (event.relatedTarget === null) dragging.value = false;
});
window.addEventListener('drop', (event) => {
  event.preventDefault();
  dragging.value = false;
  if (event.dataTransfer !== null) takeDropped(droppedFiles(event.dataTransfer));
});

const root = document.getElementById('sheet');
if (root !== null) render(<Sheet />, root);
begin();
