// Stirwright cards: shows the rows that hold every word; a list without such a row goes. Without a script all rows stay.
const words = document.getElementById('words');
document.getElementById('filter').hidden = false;
words.addEventListener('input', () => {
  const wanted = words.value.toLowerCase().split(' ');
  const cards = new Set();
  for (const list of document.querySelectorAll('section.list')) {
    let kept = 0;
    for (const row of list.querySelectorAll('[data-card]')) {
      const text = (list.querySelector('h3').textContent + ' ' + row.textContent).toLowerCase();
      row.hidden = !wanted.every(word => text.includes(word));
      if (!row.hidden) {
        kept += 1;
        cards.add(row.dataset.card);
      }
    }
    list.hidden = kept === 0;
  }
  document.getElementById('shown').textContent = cards.size + ' cards';
});
