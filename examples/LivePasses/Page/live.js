// The page of the passes. Text goes in as text only; nothing is ever read as markup.
const svgSpace = 'http://www.w3.org/2000/svg';
const width = 1140, ribbonTop = 4, ribbonHeight = 30, trendHeight = 150, trendLeft = 44, trendRight = 70;
const minutes = 30;

const byId = name => document.getElementById(name);
const passes = [];
let generator = null, held = false, latest = null;

function element(name, className, text) {
  const made = document.createElement(name);
  if (className) made.className = className;
  if (text !== undefined) made.textContent = text;
  return made;
}

function drawn(name, attributes, text) {
  const made = document.createElementNS(svgSpace, name);
  for (const key in attributes) made.setAttribute(key, attributes[key]);
  if (text !== undefined) made.textContent = text;
  return made;
}

const number = (quantity, digits) => quantity.value === null ? 'not known' : quantity.value.toFixed(digits);
const withUnit = (quantity, digits) => quantity.value === null ? 'not known' : `${quantity.value.toFixed(digits)} ${quantity.unit}`;

class PassPicture {
  constructor(shape, index, longest) {
    this.shape = shape;
    this.points = [];
    this.scale = (width - 2) / longest;
    this.end = 1 + shape.flowLength.value * this.scale;
    this.article = element('article');
    this.article.tabIndex = 0;
    this.article.setAttribute('aria-labelledby', `pass-${index}`);
    this.title = element('h2', '', `${shape.name}: waiting for its tags.`);
    this.title.id = `pass-${index}`;
    this.ribbon = this.makeRibbon(index);
    this.trend = drawn('svg', { viewBox: `0 0 ${width} ${trendHeight}`, role: 'img', class: 'trend' });
    this.cautions = element('ul', 'cautions');
    this.numbers = element('tbody');
    const figure = element('figure'), details = element('details'), table = element('table');
    figure.append(this.ribbon, this.trend);
    table.append(this.numbers);
    details.append(element('summary', '', `Numbers of ${shape.name}`), table);
    this.article.append(this.title, figure, this.cautions, details);
  }

  makeRibbon(index) {
    const ribbon = drawn('svg', { viewBox: `0 0 ${width} 62`, role: 'img' });
    const patterns = drawn('defs', {});
    const hatch = drawn('pattern', { id: `liquid-${index}`, width: 9, height: 9, patternUnits: 'userSpaceOnUse', patternTransform: 'rotate(45)' });
    hatch.append(drawn('line', { x1: 0, y1: 0, x2: 0, y2: 9, class: 'hatch' }));
    const dots = drawn('pattern', { id: `wet-${index}`, width: 8, height: 8, patternUnits: 'userSpaceOnUse' });
    dots.append(drawn('circle', { cx: 2, cy: 2, r: 1.4, class: 'dot' }), drawn('circle', { cx: 6, cy: 6, r: 1.4, class: 'dot' }));
    patterns.append(hatch, dots);
    const y = ribbonTop, height = ribbonHeight;
    this.liquid = drawn('rect', { x: 1, y, height, width: 0, fill: `url(#liquid-${index})` });
    this.wet = drawn('rect', { x: 1, y, height, width: 0, fill: `url(#wet-${index})` });
    this.onset = drawn('line', { class: 'onset', y1: y - 4, y2: y + height + 8, visibility: 'hidden' });
    this.onsetWords = drawn('text', { y: y + height + 20, class: 'strong' });
    ribbon.append(patterns, this.liquid, this.wet, drawn('rect', { x: 1, y, width: this.end - 1, height, class: 'tube' }));
    for (const section of this.shape.sections.slice(1)) {
      const x = 1 + section.starts.value * this.scale;
      ribbon.append(drawn('line', { x1: x, x2: x, y1: y, y2: y + height, class: 'joint' }));
    }
    ribbon.append(drawn('text', { x: 1, y: y + height + 20 }, `feed`), this.onset, this.onsetWords);
    ribbon.append(drawn('text', { x: this.end, y: y + height + 20, 'text-anchor': 'end' }, `outlet, ${this.shape.flowLength.value.toFixed(0)} m`));
    return ribbon;
  }

  show(pass, limit, news) {
    this.points.push(...news);
    const end = this.points.length ? Date.parse(this.points[this.points.length - 1].time) : 0;
    this.points = this.points.filter(point => end - Date.parse(point.time) <= minutes * 60000);
    this.title.textContent = pass.sentence;
    this.article.classList.toggle('doubt', pass.trust !== 'believe it');
    this.showRibbon(pass);
    this.showTrend(pass, limit, end);
    this.cautions.replaceChildren(...pass.cautions.map(caution => element('li', '', caution)));
    this.showNumbers(pass);
  }

  showRibbon(pass) {
    const onset = pass.boilingOnset.value, known = pass.quality.value !== null || onset !== null;
    const x = onset === null ? this.end : 1 + onset * this.scale;
    this.liquid.setAttribute('width', known ? x - 1 : 0);
    this.wet.setAttribute('x', x);
    this.wet.setAttribute('width', known ? this.end - x : 0);
    this.onset.setAttribute('visibility', onset === null ? 'hidden' : 'visible');
    this.onset.setAttribute('x1', x);
    this.onset.setAttribute('x2', x);
    const late = x > .7 * this.end;
    this.onsetWords.setAttribute('x', late ? x - 6 : x + 6);
    this.onsetWords.setAttribute('text-anchor', late ? 'end' : 'start');
    this.onsetWords.textContent = onset === null ? '' : `boils from ${onset.toFixed(0)} m`;
    this.ribbon.setAttribute('aria-label', onset === null
      ? `${this.shape.name}: where boiling begins is not known.`
      : `${this.shape.name}: liquid water for ${onset.toFixed(0)} m, then wet steam to its outlet at ${this.shape.flowLength.value.toFixed(0)} m.`);
  }

  showTrend(pass, limit, end) {
    const values = this.points.flatMap(point => [point.indicated, point.estimated]).filter(value => value !== null && value !== undefined);
    const low = Math.floor(20 * Math.min(limit, ...values) - .2) / 20, high = Math.ceil(20 * Math.max(limit, ...values) + .2) / 20;
    const x = time => width - trendRight - (end - Date.parse(time)) / (minutes * 60000) * (width - trendLeft - trendRight);
    const y = value => 8 + (high - value) / (high - low) * (trendHeight - 30);
    const parts = [];
    const step = high - low > .3 ? .1 : .05;
    for (let value = low; value < high + 1e-9; value += step) {
      parts.push(drawn('line', { x1: trendLeft, x2: width - trendRight, y1: y(value), y2: y(value), class: 'axis' }));
      parts.push(drawn('text', { x: trendLeft - 6, y: y(value) + 4, 'text-anchor': 'end' }, value.toFixed(2)));
    }
    parts.push(drawn('line', { x1: trendLeft, x2: width - trendRight, y1: y(limit), y2: y(limit), class: 'limit' }));
    parts.push(drawn('text', { x: trendLeft + 4, y: y(limit) - 4 }, `site limit ${limit.toFixed(2)}`));
    parts.push(drawn('text', { x: trendLeft, y: trendHeight - 2 }, `${minutes} min ago`));
    parts.push(drawn('text', { x: width - trendRight, y: trendHeight - 2, 'text-anchor': 'end' }, 'now'));
    parts.push(drawn('path', { class: 'reads', d: line(this.points, 'indicated', x, y) }));
    parts.push(drawn('path', { class: 'is', d: line(this.points, 'estimated', x, y) }));
    const reads = pass.indicatedQuality.value, is = pass.quality.value;
    let readsY = reads === null ? null : y(reads), isY = is === null ? null : y(is);
    if (readsY !== null && isY !== null && Math.abs(readsY - isY) < 13) [readsY, isY] = readsY <= isY ? [(readsY + isY) / 2 - 7, (readsY + isY) / 2 + 7] : [(readsY + isY) / 2 + 7, (readsY + isY) / 2 - 7];
    if (readsY !== null) parts.push(drawn('text', { x: width - trendRight + 6, y: readsY + 4, class: 'reads-word' }, `reads ${number(pass.indicatedQuality, 2)}`));
    if (isY !== null) parts.push(drawn('text', { x: width - trendRight + 6, y: isY + 4, class: 'is-word' }, `is ${number(pass.quality, 2)}`));
    this.trend.replaceChildren(...parts);
    this.trend.setAttribute('aria-label', `${this.shape.name} over ${minutes} minutes: indicated quality now ${number(pass.indicatedQuality, 2)}, estimated ${number(pass.quality, 2)}, limit ${limit.toFixed(2)}.`);
  }

  showNumbers(pass) {
    const rows = [
      ['Indicated quality', withUnit(pass.indicatedQuality, 3)],
      ['Estimated quality', withUnit(pass.quality, 3)],
      ['give or take, from motion and noise (2 u)', withUnit(pass.qualityWithinMotion, 3)],
      ['95 % upper value, meter and model included', withUnit(pass.upperQuality, 3)],
      ['If the meter is right', withUnit(pass.qualityIfMeterIsRight, 3)],
      ['If the heat is right', withUnit(pass.qualityIfHeatIsRight, 3)],
      ['Feed flow', withUnit(pass.feedFlow, 2)],
      ['Outlet flow', withUnit(pass.outletFlow, 2)],
      ['Water and steam held', withUnit(pass.holdup, 0)],
      ['State', pass.operatingState],
      ...pass.reasons.map((reason, i) => [i === 0 ? 'Reasons, largest first' : '', reason]),
    ];
    this.numbers.replaceChildren(...rows.map(([name, value]) => {
      const row = element('tr'), head = element('th', '', name);
      head.scope = 'row';
      row.append(head, element('td', '', value));
      return row;
    }));
  }
}

function line(points, name, x, y) {
  let path = '', up = true;
  for (const point of points) {
    const value = point[name];
    if (value === null || value === undefined) { up = true; continue; }
    path += `${up ? 'M' : 'L'}${x(point.time).toFixed(1)} ${y(value).toFixed(1)}`;
    up = false;
  }
  return path;
}

function linkWords(link) {
  const refused = link.messagesRefused ? ` ${link.messagesRefused} messages refused, the last: ${link.lastRefused.slice(0, 160)}` : '';
  return (link.connected ? 'Broker connected.' : 'No broker: trying again.') + refused;
}

function tell(pass, index) {
  const before = passes[index].trust;
  passes[index].trust = pass.trust;
  return before !== undefined && before !== pass.trust ? pass.sentence : '';
}

function show(news) {
  byId('clock').textContent = news.time ? `${new Date(news.time).toISOString().slice(0, 19).replace('T', ' ')} UTC` + (generator.simulated ? `, an invented plant, ${generator.speed ? `${generator.speed} times its time` : 'as fast as it goes'}` : '') : 'No tags yet.';
  byId('link').textContent = linkWords(news.link);
  const told = news.passes.map(tell).filter(sentence => sentence);
  if (told.length) byId('told').textContent = told.join(' ');
  news.passes.forEach((pass, i) => passes[i].show(pass, generator.qualityLimit, news.trends[i]));
}

function take(news) {
  if (held && latest) news.trends = news.trends.map((points, i) => [...latest.trends[i], ...points]);
  latest = news;
  if (!held) show(news);
}

function moveFocus(event) {
  const step = { ArrowDown: 1, ArrowUp: -1 }[event.key];
  const now = passes.findIndex(picture => picture.article === document.activeElement);
  if (!step || now < 0) return;
  const next = passes[now + step];
  if (next) { next.article.focus(); event.preventDefault(); }
}

async function begin() {
  generator = await (await fetch('/generator')).json();
  byId('generator').textContent = generator.name;
  document.title = `${generator.name}: passes, live`;
  const longest = Math.max(...generator.passes.map(pass => pass.flowLength.value));
  generator.passes.forEach((shape, i) => passes.push(new PassPicture(shape, i, longest)));
  byId('passes').replaceChildren(...passes.map(picture => picture.article));
  byId('passes').addEventListener('keydown', moveFocus);
  byId('hold').addEventListener('click', () => {
    held = !held;
    byId('hold').setAttribute('aria-pressed', held);
    if (!held && latest) show(latest);
    if (held) byId('clock').textContent += ' (held still: old)';
    if (held && latest) latest = { ...latest, trends: latest.trends.map(() => []) };
  });
  const source = new EventSource('/news');
  source.addEventListener('open', () => {
    // A new connection tells the whole trend again.
    passes.forEach(picture => { picture.points = []; });
    if (latest) latest = { ...latest, trends: latest.trends.map(() => []) };
    document.body.classList.remove('lost');
  });
  source.addEventListener('news', event => take(JSON.parse(event.data)));
  source.addEventListener('error', () => {
    document.body.classList.add('lost');
    byId('link').textContent = 'The service does not answer: what is shown is old. Trying again.';
  });
}

begin();
