/** All that a page has to do with the element: listen. The events bubble, so anywhere will do. */
const line = document.getElementById('line');
const told = document.getElementById('told');

function note(name, words) {
  const item = document.createElement('li');
  item.textContent = `${name}: ${words}`;
  told.append(item);
  while (told.children.length > 20) told.firstElementChild.remove();
}

document.addEventListener('headtree-input', ({ detail }) => {
  line.textContent = 'Changed since the last answer.';
  const size = detail.value && JSON.stringify(detail.value).length;
  note('headtree-input', size ? `${size} characters of JSON` : 'nothing that can be sent');
});

document.addEventListener('headtree-result', ({ detail: { result } }) => {
  const { check, status, utilisation, governing, profile } = result;
  const used = utilisation === null ? 'no utilisation' : `utilisation ${utilisation.toFixed(2)}`;
  // The word as it came: nothing but "pass" may look like a pass.
  line.textContent = `${status}, ${used}, ${check}: ${governing}, ${profile.slug}@${profile.revision}`;
  note('headtree-result', line.textContent);
});

document.addEventListener('headtree-error', ({ detail }) => {
  line.textContent = `No answer: ${detail.message}`;
  note('headtree-error', detail.code ?? detail.kind);
});
