/*
 * The chart element. It is given a description of what to show (property "spec", JSON text) and
 * draws it with Apache ECharts in the colours of the page, light or dark. Charts of one group move
 * their cursors and zoom together; a map in the group shows where on the circuit the cursor is.
 */
import * as echarts from '../vendor/echarts/echarts.esm.min.js';

const DASHES = { solid: 'solid', dashed: [7, 4], dotted: [2, 3], mixed: [9, 3, 2, 3] };
const elements = new Set();

/* Maps have no axis in common with the other charts of their group, so they are told by hand. */
function moveMarkers(group, distance) {
  for (const element of elements) {
    if (element.group === group) {
      element.markDistance(distance);
    }
  }
}

new MutationObserver(() => elements.forEach((element) => element.draw())).observe(
  document.documentElement,
  { attributes: true, attributeFilter: ['theme'] }
);

function number(value) {
  if (value === null || value === undefined || Number.isNaN(value)) {
    return '–';
  }
  const size = Math.abs(value);
  const digits = size >= 1000 ? 0 : size >= 100 ? 1 : size >= 10 ? 2 : 3;
  return value.toFixed(digits).replace('-', '−');
}

function withUnit(value, unit) {
  return unit ? `${number(value)} ${unit}` : number(value);
}

function escaped(text) {
  return echarts.format.encodeHTML(String(text));
}

class RampwrightChart extends HTMLElement {
  constructor() {
    super();
    this.specText = '';
    this.extra = new Map();
  }

  set spec(text) {
    this.specText = text;
    this.extra.clear();
    this.draw();
  }

  get spec() {
    return this.specText;
  }

  connectedCallback() {
    elements.add(this);
    if (!this.stage) {
      this.stage = document.createElement('div');
      this.stage.style.width = '100%';
      this.stage.style.height = '100%';
      this.append(this.stage);
    }
    this.observer = new ResizeObserver(() => this.resized());
    this.observer.observe(this);
    this.draw();
  }

  disconnectedCallback() {
    elements.delete(this);
    this.observer.disconnect();
    this.chart?.dispose();
    this.chart = undefined;
  }

  /* Adds points (JSON text of [[x, y], ...]) to a series without sending the others again. */
  addPoints(series, pointsText) {
    const known = this.extra.get(series) ?? [];
    this.extra.set(series, known.concat(JSON.parse(pointsText)));
    this.draw();
  }

  resized() {
    if (!this.chart) {
      this.draw();
      return;
    }
    this.chart.resize();
    if (this.description?.kind === 'map') {
      this.chart.setOption(this.mapExtent());
    }
  }

  draw() {
    if (!this.isConnected || !this.specText || this.clientWidth === 0 || this.clientHeight === 0) {
      return;
    }
    this.description = JSON.parse(this.specText);
    this.group = this.description.group;
    if (!this.chart) {
      this.chart = echarts.init(this.stage, null, { renderer: 'canvas' });
      this.chart.on('updateAxisPointer', (event) => this.cursorMoved(event));
      this.chart.on('click', (event) => {
        const distance = event.data?.distance ?? event.value?.[0];
        if (distance !== undefined) {
          this.dispatchEvent(new CustomEvent('chart-click', { detail: { x: distance } }));
        }
      });
    }
    const option = this.description.kind === 'map' ? this.mapOption() : this.lineOption();
    this.chart.setOption(option, true);
    if (this.group && this.description.kind !== 'map') {
      this.chart.group = this.group;
      echarts.connect(this.group);
    }
  }

  cursorMoved(event) {
    const info = event.axesInfo?.find((axis) => axis.axisDim === 'x');
    if (info && this.group) {
      moveMarkers(this.group, info.value);
    }
  }

  colour(name) {
    return name?.startsWith('--') ? this.css(name) : name;
  }

  css(name) {
    return getComputedStyle(this).getPropertyValue(name).trim();
  }

  axis(axis, more) {
    const line = this.css('--rw-chart-line');
    const text = this.css('--rw-chart-text');
    return {
      type: 'value',
      scale: true,
      min: axis.min ?? undefined,
      max: axis.max ?? undefined,
      name: axis.unit ? `${axis.label} (${axis.unit})` : axis.label,
      nameTextStyle: { color: text, fontSize: 11 },
      axisLine: { lineStyle: { color: line }, onZero: false },
      axisTick: { lineStyle: { color: line } },
      axisLabel: { color: text, fontSize: 11, hideOverlap: true, formatter: (value) => String(value).replace('-', '−') },
      splitLine: { lineStyle: { color: line, opacity: 0.55 } },
      ...more,
    };
  }

  lineOption() {
    const spec = this.description;
    const text = this.css('--rw-chart-text');
    const series = spec.series.map((line, index) => this.line(line, index));
    if (spec.marks?.length && series.length) {
      series[0].markLine = this.marks(spec.marks);
    }
    return {
      animation: false,
      textStyle: { fontFamily: getComputedStyle(this).fontFamily },
      grid: { left: 64, right: 18, top: spec.marks?.length ? 40 : 28, bottom: 40 },
      legend: {
        show: series.length > 1,
        top: 0,
        left: 60,
        itemWidth: 26,
        itemHeight: 9,
        itemGap: 14,
        textStyle: { color: text, fontSize: 11 },
        data: spec.series.filter((line) => line.name).map((line) => line.name),
      },
      tooltip: {
        trigger: spec.kind === 'points' ? 'item' : 'axis',
        confine: true,
        backgroundColor: this.css('--rw-chart-tip'),
        borderColor: this.css('--rw-chart-line'),
        padding: [4, 8],
        textStyle: { color: this.css('--rw-chart-strong'), fontSize: 11 },
        formatter: (items) => this.tip(Array.isArray(items) ? items : [items]),
      },
      axisPointer: { lineStyle: { color: this.css('--rw-chart-strong'), width: 1 }, label: { show: false } },
      dataZoom: spec.kind === 'points' ? [] : [{ type: 'inside', filterMode: 'none', zoomOnMouseWheel: 'ctrl' }],
      xAxis: this.axis(spec.x, { nameLocation: 'middle', nameGap: 24, min: spec.x.min ?? 'dataMin', max: spec.x.max ?? 'dataMax' }),
      yAxis: this.axis(spec.y, { nameLocation: 'middle', nameGap: 48 }),
      series,
    };
  }

  line(line, index) {
    const colour = this.colour(line.colour);
    const points = line.scatter;
    const data = line.data.concat(this.extra.get(index) ?? []);
    return {
      id: `s${index}`,
      name: line.name,
      type: points ? 'scatter' : 'line',
      data,
      symbol: points ? line.symbol : 'none',
      symbolSize: points ? 5 : 4,
      step: line.step ? 'end' : false,
      large: points && data.length > 3000,
      lineStyle: { color: colour, width: 1.7, type: DASHES[line.dash] ?? 'solid' },
      itemStyle: { color: colour, opacity: points ? 0.6 : 1 },
      emphasis: { disabled: true },
    };
  }

  marks(marks) {
    return {
      symbol: 'none',
      silent: true,
      lineStyle: { color: this.css('--rw-chart-line'), type: 'dotted', width: 1 },
      label: { color: this.css('--rw-chart-text'), fontSize: 10, distance: 2, formatter: (item) => item.name },
      data: marks.map((mark) => ({ xAxis: mark.x, name: mark.label })),
    };
  }

  tip(items) {
    const spec = this.description;
    const rows = items
      .filter((item) => item.value)
      .map((item) => {
        const unit = spec.y.unit;
        return `${item.marker ?? ''}${escaped(item.seriesName)} <b>${escaped(withUnit(item.value[1], unit))}</b>`;
      });
    if (!rows.length) {
      return '';
    }
    const head = `${escaped(spec.x.label)} ${escaped(withUnit(items[0].value[0], spec.x.unit))}`;
    return [head, ...rows].join('<br>');
  }

  /* A circuit seen from above: one polyline in short pieces, each in the colour of its value. */
  mapOption() {
    const spec = this.description;
    const hidden = { type: 'value', show: false, scale: true };
    const places = spec.places;
    const pieces = [];
    for (let i = 0; i + 1 < places.length; i++) {
      const a = places[i];
      const b = places[i + 1];
      pieces.push({ coords: [[a[1], a[2]], [b[1], b[2]]], distance: a[0], shade: a[3], lineStyle: { color: this.shade(a[3]) } });
    }
    const strong = this.css('--rw-chart-strong');
    return {
      animation: false,
      textStyle: { fontFamily: getComputedStyle(this).fontFamily },
      tooltip: {
        confine: true,
        backgroundColor: this.css('--rw-chart-tip'),
        borderColor: this.css('--rw-chart-line'),
        padding: [4, 8],
        textStyle: { color: strong, fontSize: 11 },
        formatter: (item) => this.mapTip(item),
      },
      grid: { left: 14, right: 14, top: 14, bottom: 14 },
      ...this.mapExtent(hidden),
      series: [
        {
          id: 'line',
          type: 'lines',
          coordinateSystem: 'cartesian2d',
          data: pieces,
          lineStyle: { width: 5, opacity: 1, cap: 'round' },
        },
        {
          id: 'corners',
          type: 'scatter',
          silent: true,
          symbolSize: 1,
          data: (spec.labels ?? []).map((label) => ({ value: [label.x, label.y], name: label.text })),
          label: { show: true, position: 'inside', formatter: (item) => item.name, color: strong, fontSize: 12, fontWeight: 600, textBorderColor: this.css('--rw-chart-tip'), textBorderWidth: 3 },
        },
        {
          id: 'start',
          type: 'scatter',
          silent: true,
          symbol: 'rect',
          symbolSize: 9,
          data: places.length ? [[places[0][1], places[0][2]]] : [],
          itemStyle: { color: this.css('--rw-chart-tip'), borderColor: strong, borderWidth: 2 },
        },
        {
          id: 'marker',
          type: 'scatter',
          silent: true,
          symbolSize: 11,
          data: [],
          itemStyle: { color: 'transparent', borderColor: strong, borderWidth: 3 },
        },
      ],
    };
  }

  /* One metre is as long across as it is up, whatever the shape of the element. */
  mapExtent(more = {}) {
    const places = this.description.places;
    const xs = places.map((place) => place[1]);
    const ys = places.map((place) => place[2]);
    const width = Math.max(1, this.clientWidth - 28);
    const height = Math.max(1, this.clientHeight - 28);
    const middle = (values) => (Math.min(...values) + Math.max(...values)) / 2;
    const spread = (values) => Math.max(1, Math.max(...values) - Math.min(...values));
    const scale = Math.max(spread(xs) / width, spread(ys) / height) * 1.12;
    const range = (values, pixels) => ({
      min: middle(values) - (scale * pixels) / 2,
      max: middle(values) + (scale * pixels) / 2,
    });
    return { xAxis: { ...more, ...range(xs, width) }, yAxis: { ...more, ...range(ys, height) } };
  }

  /* Shade -1 is the colour of loss, 0 that of no difference, 1 that of gain. */
  shade(value) {
    if (value === null || value === undefined) {
      return this.css('--rw-map-even');
    }
    const end = this.css(value > 0 ? '--rw-map-gain' : '--rw-map-loss');
    const from = echarts.color.parse(this.css('--rw-map-even'));
    const to = echarts.color.parse(end);
    const share = Math.min(1, Math.abs(value));
    const mixed = [0, 1, 2].map((i) => Math.round(from[i] + (to[i] - from[i]) * share));
    return `rgb(${mixed.join(',')})`;
  }

  mapTip(item) {
    const distance = item.data?.distance;
    if (distance === undefined) {
      return '';
    }
    const rows = [`distance ${number(distance)} m`];
    const value = this.description.value;
    if (value && item.data.shade !== null && item.data.shade !== undefined) {
      rows.push(`${escaped(value.label)} ${escaped(withUnit(item.data.shade * value.full, value.unit))}`);
    }
    return rows.join('<br>');
  }

  markDistance(distance) {
    if (this.description?.kind !== 'map' || !this.chart) {
      return;
    }
    const places = this.description.places;
    let nearest = places[0];
    for (const place of places) {
      if (Math.abs(place[0] - distance) < Math.abs(nearest[0] - distance)) {
        nearest = place;
      }
    }
    this.chart.setOption({ series: [{ id: 'marker', data: [[nearest[1], nearest[2]]] }] });
  }
}

customElements.define('rw-chart', RampwrightChart);
