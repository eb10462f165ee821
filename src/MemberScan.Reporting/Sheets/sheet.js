// @ts-check
'use strict';
/**
 * Sheets of members that the page holds in packed form: texts come as the program wrote them, pictures are drawn here with the strokes that
 * the program has under the same names (class Ink). Nothing is loaded.
 *
 * @typedef {{ columns: number, rows: number, left: number, bottom: number, cell: number }} Grid
 * @typedef {{ name: string, width: string, depth: string, area: number, iy: number, iz: number, iyz: number, radius: number, rings: number[][],
 *   grid: number[], nodes: number[], scales: number[], units: number[][], sites: number[] }} PackedSection
 * @typedef {{ y: number[], z: number[], inside: boolean[], numbers: Int32Array, units: number[][] }} Samples
 * @typedef {{ rows: number[], keys: string[], columns: string[] }} Shape
 * @typedef {{ texts: string[], shapes: Shape[], sections: PackedSection[] }} Packed
 * @typedef {[number, number, number]} State σ, τxy, τxz
 */
(() => {
  const scope = /** @type {any} */ (globalThis);
  const memberScan = scope.memberScan ??= {};

  // Strokes.

  /** @param {number} v */
  const c = v => String(Math.round(v * 10) / 10 + 0);
  /** @param {string} text */
  const encoded = text => text.replace(/[&<>"']/g, m => `&#${m.charCodeAt(0)};`);
  /** @param {string} style @param {string} data */
  const path = (style, data) => data ? `<path class="${style}" d="${data}"/>` : '';
  /** @param {string} style @param {number} x @param {number} y @param {string} anchor @param {string} content */
  const text = (style, x, y, anchor, content) => `<text class="${style}" x="${c(x)}" y="${c(y)}" text-anchor="${anchor}">${encoded(content)}</text>`;
  /** @param {number} x1 @param {number} y1 @param {number} x2 @param {number} y2 @param {number} head */
  const arrow = (x1, y1, x2, y2, head) => {
    const length = Math.hypot(x2 - x1, y2 - y1);
    if (length === 0) return '';
    const [ux, uy] = [head * (x2 - x1) / length, head * (y2 - y1) / length];
    return `M${c(x1)} ${c(y1)}L${c(x2)} ${c(y2)}M${c(x2 - ux + 0.45 * uy)} ${c(y2 - uy - 0.45 * ux)}L${c(x2)} ${c(y2)}L${c(x2 - ux - 0.45 * uy)} ${c(y2 - uy + 0.45 * ux)}`;
  };
  /** @param {number} x1 @param {number} y1 @param {number} x2 @param {number} y2 */
  const line = (x1, y1, x2, y2) => `M${c(x1)} ${c(y1)}L${c(x2)} ${c(y2)}`;
  /** @param {string} style @param {number} x @param {number} y @param {number} radius */
  const circle = (style, x, y, radius) => `<circle class="${style}" cx="${c(x)}" cy="${c(y)}" r="${c(radius)}"/>`;
  /** @param {string} style @param {number} x @param {number} y @param {number} width @param {number} height */
  const box = (style, x, y, width, height) => `<rect class="${style}" x="${c(x)}" y="${c(y)}" width="${c(width)}" height="${c(height)}"/>`;
  /** @param {number} width @param {number} height @param {string} words @param {string} content */
  const picture = (width, height, words, content) => `<svg viewBox="0 0 ${c(width)} ${c(height)}" role="img" aria-label="${encoded(words)}">${content}</svg>`;
  /** @param {number} value */
  const round = value => {
    const power = 10 ** Math.floor(Math.log10(value));
    return power * ([1, 2, 2.5, 5].find(step => step * power >= value * (1 - 1e-9)) ?? 10);
  };
  /** @param {number} value */
  const short = value => value === 0 ? '0' : String(Number(value.toPrecision(4))).replace('-', '\u2212');

  // Contours: marching squares, as ContourLines.

  const ways = [[], [0, 3], [1, 0], [1, 3], [2, 1], [0, 3, 2, 1], [2, 0], [2, 3], [3, 2], [0, 2], [1, 0, 3, 2], [1, 2], [3, 1], [0, 1], [3, 0], [], [0, 1, 2, 3], [1, 2, 3, 0]];

  /** @param {Grid} grid @param {Int32Array} numbers @param {number[]} values @param {number} level @param {number} x @param {number} y @param {number} scale */
  const contour = (grid, numbers, values, level, x, y, scale) => {
    /** @param {number} node */
    const at = node => numbers[node] >= 0 ? values[numbers[node]] : -Infinity;
    /** @type {Map<number, number>} */
    const next = new Map();
    /** @param {number} node @param {number} side */
    const edge = (node, side) => side === 0 ? 2 * node : side === 1 ? 2 * (node + 1) + 1 : side === 2 ? 2 * (node + grid.columns) : 2 * node + 1;
    for (let row = 0; row + 1 < grid.rows; row++) {
      for (let column = 0; column + 1 < grid.columns; column++) {
        const node = row * grid.columns + column;
        const corners = [at(node), at(node + 1), at(node + grid.columns + 1), at(node + grid.columns)];
        let kind = corners.reduce((sum, v, i) => sum | (v >= level ? 1 << i : 0), 0);
        if ((kind === 5 || kind === 10) && (corners[0] + corners[1] + corners[2] + corners[3]) / 4 >= level) kind = kind === 5 ? 16 : 17;
        for (let i = 0; i < ways[kind].length; i += 2) next.set(edge(node, ways[kind][i]), edge(node, ways[kind][i + 1]));
      }
    }
    /** @param {number} id */
    const crossing = id => {
      const [node, upright] = [id >> 1, (id & 1) === 1];
      const [from, to] = [at(node), at(node + (upright ? grid.columns : 1))];
      const share = from === -Infinity ? 0.02 : to === -Infinity ? 0.98 : (level - from) / (to - from);
      return [x + (grid.left + (node % grid.columns + (upright ? 0 : share)) * grid.cell) * scale, y - (grid.bottom + (Math.floor(node / grid.columns) + (upright ? share : 0)) * grid.cell) * scale];
    };
    let data = '';
    while (next.size > 0) {
      const loop = [];
      let id = /** @type {number} */ (next.keys().next().value);
      for (let following = next.get(id); following !== undefined; following = next.get(id)) {
        next.delete(id);
        loop.push(crossing(id));
        id = following;
      }
      data += closed(loop);
    }
    return data;
  };

  /** @param {number[][]} loop */
  const closed = loop => {
    if (loop.length < 3) return '';
    let kept = 0;
    let data = `M${c(loop[0][0])} ${c(loop[0][1])}`;
    for (let i = 2; i <= loop.length; i++) {
      if (i < loop.length && straight(loop, kept, i)) continue;
      kept = i - 1;
      data += `L${c(loop[kept][0])} ${c(loop[kept][1])}`;
    }
    return data + 'Z';
  };

  /** @param {number[][]} loop @param {number} from @param {number} to */
  const straight = (loop, from, to) => {
    const [dx, dy] = [loop[to][0] - loop[from][0], loop[to][1] - loop[from][1]];
    const length = Math.hypot(dx, dy);
    for (let i = from + 1; i < to; i++) {
      const [px, py] = [loop[i][0] - loop[from][0], loop[i][1] - loop[from][1]];
      if ((length === 0 ? Math.hypot(px, py) : Math.abs(px * dy - py * dx) / length) > 0.2) return false;
    }
    return true;
  };

  // Stress fields out of the tables of unit forces.

  /** @type {Map<PackedSection, Samples>} */
  const unpacked = new Map();

  /** @param {PackedSection} section @returns {Samples} */
  const samplesOf = section => {
    const known = unpacked.get(section);
    if (known) return known;
    const [columns, rows, left, bottom, cell] = section.grid;
    const samples = { y: /** @type {number[]} */ ([]), z: /** @type {number[]} */ ([]), inside: /** @type {boolean[]} */ ([]), numbers: new Int32Array(columns * rows).fill(-1), units: /** @type {number[][]} */ ([]) };
    let node = -1;
    section.nodes.forEach((code, i) => {
      node += code >> 1;
      samples.numbers[node] = i;
      samples.inside.push((code & 1) === 1);
      samples.y.push(left + node % columns * cell);
      samples.z.push(bottom + Math.floor(node / columns) * cell);
    });
    section.units.forEach((steps, k) => {
      let sum = 0;
      samples.units.push(steps.map(step => (sum += step) * section.scales[k]));
    });
    unpacked.set(section, samples);
    return samples;
  };

  /** @param {PackedSection} s @param {number[]} f N, Vy, Vz, T, My, Mz [N, N·m] */
  const plane = (s, f) => {
    const d = s.iy * s.iz - s.iyz * s.iyz;
    return [f[0] / s.area, -(f[5] * s.iy + f[4] * s.iyz) / d, (f[4] * s.iz + f[5] * s.iyz) / d];
  };

  /** @param {PackedSection} section @param {number[]} f @returns {State[]} */
  const over = (section, f) => {
    const samples = samplesOf(section);
    const [n, perY, perZ] = plane(section, f);
    return samples.y.map((y, i) => {
      const z = samples.z[i];
      const sigma = n + perY * y + perZ * z;
      if (section.radius > 0) return roundBar(section, f, y, z, sigma);
      const u = samples.units;
      return /** @type {State} */ ([sigma, f[1] * u[0][i] + f[2] * u[2][i] + f[3] * u[4][i], f[1] * u[1][i] + f[2] * u[3][i] + f[3] * u[5][i]]);
    });
  };

  /** The round bar's shear follows the resultant: (4/3)(V/A)(1 − s²/r²); with torsion T·r/J. @param {PackedSection} section @param {number[]} f @param {number} y @param {number} z @param {number} sigma @returns {State} */
  const roundBar = (section, f, y, z, sigma) => {
    const [r, v, at] = [section.radius, Math.hypot(f[1], f[2]), Math.hypot(y, z)];
    const inward = at > r ? r / at : 1;
    const [py, pz] = [y * inward, z * inward];
    const along = v > 0 ? (py * f[1] + pz * f[2]) / v : 0;
    const k = 4 / 3 / section.area * (1 - along * along / (r * r));
    const twist = f[3] / (section.iy + section.iz);
    return [sigma, k * f[1] - twist * pz, k * f[2] + twist * py];
  };

  /** @param {State} s @param {string} measure */
  const valueOf = ([sigma, xy, xz], measure) => measure === 'sg' ? sigma : measure === 'ta' ? Math.hypot(xy, xz) : Math.sqrt(sigma * sigma + 3 * (xy * xy + xz * xz));

  // Pictures.

  const bands = 8, side5 = 5;

  /** The section with its field, as FieldPicture. */
  class Field {
    /** @param {PackedSection} section @param {string} id @param {number} size */
    constructor(section, id, size) {
      this.section = section;
      this.id = id;
      this.samples = samplesOf(section);
      const [columns, rows, left, bottom, cell] = section.grid;
      /** @type {Grid} */
      this.grid = { columns, rows, left, bottom, cell };
      const ys = section.rings[0].filter((_, i) => i % 2 === 0), zs = section.rings[0].filter((_, i) => i % 2 === 1);
      this.leastY = Math.min(...ys);
      this.mostY = Math.max(...ys);
      this.leastZ = Math.min(...zs);
      this.mostZ = Math.max(...zs);
      this.side = size * 0.74;
      this.middle = size / 2;
      this.scale = this.side / Math.max(this.mostY - this.leastY, this.mostZ - this.leastZ);
      this.x = this.middle - (this.leastY + this.mostY) / 2 * this.scale;
      this.y = this.middle + (this.leastZ + this.mostZ) / 2 * this.scale;
    }

    /** @param {number} y */
    X(y) { return this.x + y * this.scale; }

    /** @param {number} z */
    Y(z) { return this.y - z * this.scale; }

    edge() {
      return this.section.rings.map(ring => 'M' + ring.reduce((/** @type {string[]} */ all, v, i) => i % 2 ? all : [...all, `${c(this.X(v))} ${c(this.Y(ring[i + 1]))}`], []).join('L') + 'Z').join('');
    }

    outline() {
      return `<defs><path id="${this.id}-o" clip-rule="evenodd" fill-rule="evenodd" d="${this.edge()}"/><clipPath id="${this.id}"><use href="#${this.id}-o" clip-rule="evenodd"/></clipPath>`
        + `<pattern id="${this.id}-p" width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(45)"><path class="pressed" d="M0 0V5"/></pattern></defs>`;
    }

    /** @param {string} data */
    hatched(data) { return data ? `<path fill="url(#${this.id}-p)" d="${data}"/>` : ''; }

    /** @param {string} style */
    use(style) { return `<use class="${style}" href="#${this.id}-o"/>`; }

    /** @param {State[]} states @param {string} measure */
    step(states, measure) {
      let largest = 0;
      states.forEach((s, i) => { if (this.samples.inside[i]) largest = Math.max(largest, Math.abs(valueOf(s, measure))); });
      return largest > 1 ? round(largest / 1e6 / (measure === 'sg' ? side5 : bands)) * 1e6 : 0;
    }

    /** @param {number} band @param {boolean} signed */
    style(band, signed) { return !signed ? `b${band}` : band >= 0 ? `t${band + 1}` : `c${-band}`; }

    /** @param {State[]} states @param {string} measure */
    contours(states, measure) {
      const step = this.step(states, measure);
      if (step === 0) return this.use('b0');
      const values = states.map(s => valueOf(s, measure));
      const signed = measure === 'sg';
      let content = this.use(signed ? 'c5' : 'b0') + `<g clip-path="url(#${this.id})">`;
      for (let band = signed ? 1 - side5 : 1; band < (signed ? side5 : bands); band++)
        content += path(this.style(band, signed), contour(this.grid, this.samples.numbers, values, band * step, this.x, this.y, this.scale));
      if (signed) content += this.hatched(contour(this.grid, this.samples.numbers, values.map(v => -v), 1e-9 * step, this.x, this.y, this.scale));
      return content + '</g>';
    }

    frame() {
      const [left, right, top, bottom] = [this.X(this.leastY), this.X(this.mostY), this.Y(this.mostZ), this.Y(this.leastZ)];
      const [far, foot] = [2 * this.middle - 4, 2 * this.middle - 14];
      return path('edge', this.edge()) + path('ax', arrow(4, this.y, far, this.y, 7) + arrow(this.x, foot, this.x, 4, 7))
        + text('name', far, this.y - 6, 'end', 'y') + text('name', this.x + 7, 14, 'start', 'z')
        + path('dimension', `M${c(left)} ${c(foot)}H${c(right)}M${c(left)} ${c(foot - 5)}v10M${c(right)} ${c(foot - 5)}v10M12 ${c(top)}V${c(bottom)}M7 ${c(top)}h10M7 ${c(bottom)}h10`)
        + text('note', this.middle + 8, foot - 4, 'start', this.section.width) + text('note', 4, top - 7, 'start', this.section.depth);
    }

    /** @param {State[]} states */
    arrows(states) {
      const largest = Math.max(0, ...this.section.sites.map(i => valueOf(states[i], 'ta')));
      if (largest <= 1) return '';
      const half = 0.05 * this.side / largest;
      return this.section.sites.filter(i => valueOf(states[i], 'ta') >= 0.06 * largest).map(i => {
        const [dx, dy] = [states[i][1] * half, -states[i][2] * half];
        const [px, py] = [this.X(this.samples.y[i]), this.Y(this.samples.z[i])];
        return arrow(px - dx, py - dy, px + dx, py + dy, 0.02 * this.side);
      }).join('');
    }

    /** @param {number[]} p */
    neutral([n, perY, perZ]) {
      const slope = Math.hypot(perY, perZ);
      if (slope === 0) return '';
      const [footY, footZ] = [-n * perY / (slope * slope), -n * perZ / (slope * slope)];
      const [reach, off] = [0.56 * this.side / this.scale, Math.hypot(footY, footZ)];
      if (off >= reach) return '';
      const half = Math.sqrt(reach * reach - off * off);
      const [dy, dz] = [-perZ / slope * half, perY / slope * half];
      return path('neutral', line(this.X(footY - dy), this.Y(footZ - dz), this.X(footY + dy), this.Y(footZ + dz)));
    }

    /** @param {number} y @param {number} z */
    point(y, z) {
      const s = this.side;
      return circle('pointHalo', this.X(y), this.Y(z), 0.03 * s) + path('point', `M${c(this.X(y))} ${c(this.Y(z) - 0.022 * s)}l${c(0.02 * s)} ${c(0.036 * s)}h${c(-0.04 * s)}z`);
    }

    /** @param {State[]} states @param {string} measure */
    legend(states, measure) {
      const step = this.step(states, measure), top = 2 * this.middle + 14;
      const name = measure === 'vm' ? 'σvM' : measure === 'ta' ? 'τ' : 'σ';
      if (step === 0) return text('note', 4, top + 12, 'start', `${name} is zero all over`);
      const signed = measure === 'sg';
      const [first, count] = signed ? [-side5, 2 * side5] : [0, bands];
      const width = (2 * this.middle - 52) / count;
      let content = text('note', 2, top + 11, 'start', name);
      for (let i = 0; i < count; i++) {
        content += box(this.style(first + i, signed), 37 + i * width, top, width, 13);
        if (signed && first + i < 0) content += this.hatched(`M${c(37 + i * width)} ${c(top)}h${c(width)}v13h${c(-width)}z`);
      }
      for (let i = 0; i <= count; i++) {
        const value = (first + i) * step;
        content += text('tick', 37 + i * width, top + 24, 'middle', short(value / 1e6));
        if (i % 2 === 0) content += text('tick us', 37 + i * width, top + 35, 'middle', short(value / (4448.2216152605 / (0.0254 * 0.0254))));
      }
      return content + text('tick', 0, top + 24, 'start', 'MPa') + text('tick us', 0, top + 35, 'start', 'ksi');
    }
  }

  /** @param {PackedSection} section @param {number[]} f @param {number[]} at @param {string} id @param {string} words */
  const large = (section, f, at, id, words) => {
    const field = new Field(section, id, 340), states = over(section, f);
    return picture(340, 392, words, field.outline() + ['vm', 'sg', 'ta'].map(m => `<g class="layer ${m}">${field.contours(states, m)}${field.legend(states, m)}</g>`).join('')
      + field.frame() + path('flow', field.arrows(states)) + field.neutral(plane(section, f)) + field.point(at[0], at[1]));
  };

  /** @param {PackedSection} section @param {number[]} f @param {number[]} at @param {number} component @param {string} id @param {string} words */
  const small = (section, f, at, component, id, words) => {
    const only = f.map((v, i) => i === component ? v : 0), shear = component >= 1 && component <= 3;
    const field = new Field(section, id, 120), states = over(section, only);
    return picture(120, 120, words, field.outline() + field.contours(states, shear ? 'ta' : 'sg') + path('edge', field.edge())
      + (shear ? path('flow', field.arrows(states)) : field.neutral(plane(section, only))) + field.point(at[0], at[1]));
  };

  const width = 230, height = 200, middle = 92, halfSide = 30;

  /** @param {State} state @param {string[]} labels @param {string} words */
  const mohr = ([sigma, xy, xz], labels, words) => {
    const tau = Math.hypot(xy, xz), radius = Math.hypot(sigma / 2, tau);
    if (radius === 0) return picture(width, height, words, text('note', width / 2, middle, 'middle', 'unstressed'));
    const [s1, s3] = [sigma / 2 + radius, sigma / 2 - radius];
    const scale = 150 / (s1 - s3);
    /** @param {number} s */
    const X = s => (width - 150) / 2 + (s - s3) * scale;
    const [px, up] = [X(sigma), tau * scale];
    return picture(width, height, words,
      circle('mohr', X(sigma / 2), middle, radius * scale) + circle('mohr in', X(s1 / 2), middle, s1 / 2 * scale) + circle('mohr in', X(s3 / 2), middle, -s3 / 2 * scale)
      + path('ax', arrow(6, middle, width - 6, middle, 6) + arrow(X(0), 174, X(0), 8, 6)) + text('name', width - 6, middle - 6, 'end', 'σ') + text('name', X(0) + 6, 16, 'start', 'τ')
      + path('limit', line(px, middle - up, X(0), middle + up)) + path('point', `M${c(px)} ${c(middle - up - 5)}l5 9h-10z`)
      + path('tickmark', line(X(s1), middle - 4, X(s1), middle + 4) + line(X(s3), middle - 4, X(s3), middle + 4))
      + text('name', X(s1) + 3, middle + 16, 'start', 'σ1') + text('name', X(s3) - 3, middle + 16, 'end', 'σ3')
      + text('note', width / 2, height - 16, 'middle', labels[0]) + text('note', width / 2, height - 3, 'middle', labels[1]));
  };

  /** @param {number} sigma @param {number} tau @param {string} axis @param {string[]} labels σ, τ, both @param {string} words */
  const element = (sigma, tau, axis, labels, words) => {
    const cx = width / 2;
    let content = box('element', cx - halfSide, middle - halfSide, 2 * halfSide, 2 * halfSide);
    if (sigma !== 0) {
      const [near, far] = sigma > 0 ? [halfSide + 10, halfSide + 40] : [halfSide + 40, halfSide + 10];
      content += path('pull', arrow(cx + near, middle, cx + far, middle, 7) + arrow(cx - near, middle, cx - far, middle, 7)) + text('note', width - 2, middle + 18, 'end', labels[0]);
    }
    if (tau !== 0) {
      const s = Math.sign(tau) * (halfSide - 3), off = halfSide + 6;
      content += path('flow', arrow(cx + off, middle + s, cx + off, middle - s, 7) + arrow(cx - off, middle - s, cx - off, middle + s, 7)
        + arrow(cx - s, middle - off, cx + s, middle - off, 7) + arrow(cx + s, middle + off, cx - s, middle + off, 7)) + text('note', cx, middle - halfSide - 14, 'middle', labels[1]);
    }
    return picture(width, height, words, content + path('ax', arrow(12, 172, 40, 172, 5) + arrow(12, 172, 12, 144, 5)) + text('name', 44, 176, 'start', 'x') + text('name', 12, 139, 'middle', axis)
      + text('note', cx, height - 3, 'middle', labels[2]));
  };

  /** @param {number[][][]} lines points of x, N, Vy, Vz, T, My, Mz, whether a station @param {number[]} given length, governing station @param {string[]} labels @param {string} words */
  const along = (lines, given, labels, words) => {
    const [length, governing] = given, left = 46, right = 420, row = 58;
    const from = Math.min(0, ...lines.map(l => l[0][0])), to = Math.max(length, ...lines.map(l => l[l.length - 1][0]));
    /** @param {number} x */
    const X = x => left + (x - from) / (to - from) * (right - left);
    let content = '', top = 6;
    ['N', 'Vy', 'Vz', 'T', 'My', 'Mz'].forEach((name, k) => {
      const most = Math.max(...lines.flat().map(p => Math.abs(p[k + 1])));
      if (most === 0) {
        content += text('name', 4, top + 14, 'start', name) + path('base', line(left, top + 10, right, top + 10)) + text('note', right + 10, top + 14, 'start', 'zero');
        top += 22;
        return;
      }
      const centre = top + row / 2;
      for (const points of lines) {
        const way = points.map(p => `${c(X(p[0]))} ${c(centre - p[k + 1] / most * 19)}`).join('L');
        content += path('area', `M${c(X(points[0][0]))} ${c(centre)}L${way}L${c(X(points[points.length - 1][0]))} ${c(centre)}Z`) + path('curve', 'M' + way)
          + path('station', points.filter(p => p[7] === 1).map(p => line(X(p[0]), centre - 2, X(p[0]), centre + 2)).join(''));
      }
      content += path('base', line(left, centre, right, centre)) + text('name', 4, centre + 4, 'start', name) + text('note', right + 10, centre - 6, 'start', labels[2 * k]);
      if (labels[2 * k + 1]) content += text('note', right + 10, centre + 12, 'start', labels[2 * k + 1]);
      top += row;
    });
    content += path('limit', line(X(governing), 4, X(governing), top)) + text('note', X(governing), top + 12, 'middle', labels[12]);
    return picture(640, top + 18, words, content);
  };

  /** @param {number[]} v x, y and z of the member, three numbers each @param {string} words */
  const axes = (v, words) => {
    /** @param {number[]} a */
    const seen = ([x, y, z]) => [0.866 * (x + y), 0.5 * (x - y) - z];
    /** @param {number[]} axis @param {string} name @param {string} style @param {number} length @param {number} px @param {number} py */
    const arm = (axis, name, style, length, px, py) => {
      const [dx, dy] = seen(axis);
      return path(style, arrow(px, py, px + dx * length, py + dy * length, 6)) + text('name', px + dx * (length + 9), py + dy * (length + 9) + 4, 'middle', name);
    };
    const [x, y, z] = [v.slice(0, 3), v.slice(3, 6), v.slice(6, 9)], [bx, by] = seen(x);
    return picture(230, 150, words, arm([1, 0, 0], 'X', 'ax', 22, 34, 112) + arm([0, 1, 0], 'Y', 'ax', 22, 34, 112) + arm([0, 0, 1], 'Z', 'ax', 22, 34, 112)
      + path('bar', line(132, 84, 132 + bx * 52, 84 + by * 52)) + arm(x, 'x', 'own', 60, 132, 84) + arm(y, 'y', 'own', 40, 132, 84) + arm(z, 'z', 'own', 40, 132, 84));
  };

  // Unpacking.

  /** @type {Promise<{ packed: Packed, places: Map<string, [number, number]> }> | undefined} */
  let opened;

  const open = () => opened ??= (async () => {
    const source = document.getElementById('sheet-data')?.textContent?.trim();
    if (!source) return { packed: { texts: [], shapes: [], sections: [] }, places: new Map() };
    const bytes = Uint8Array.from(atob(source), ch => ch.charCodeAt(0));
    const stream = new Blob([bytes]).stream().pipeThrough(new DecompressionStream('deflate'));
    /** @type {Packed} */
    const packed = JSON.parse(await new Response(stream).text());
    const places = new Map();
    packed.shapes.forEach((shape, s) => shape.keys.forEach((key, i) => places.set(key, [s, i])));
    return { packed, places };
  })();

  /** @type {Map<Shape, string[][]>} */
  const cut = new Map();

  /** The sheet of a member as the program wrote it. @param {Packed} packed @param {Shape} shape @param {number} index */
  const written = (packed, shape, index) => {
    let columns = cut.get(shape);
    if (!columns) cut.set(shape, columns = shape.columns.map(column => column.split('\t')));
    let next = 0;
    const values = columns;
    return shape.rows.map(row => packed.texts[row].replace(/\u0001/g, () => values[next++][index])).join('');
  };

  /** @param {string | undefined} list */
  const numbers = list => (list ?? '').split(' ').filter(v => v).map(Number);

  /** @param {HTMLElement} sheet @param {Packed} packed @param {string} id */
  const draw = (sheet, packed, id) => {
    for (const attribute of ['id', 'for', 'name']) {
      for (const found of sheet.querySelectorAll(`[${attribute}^="one-sheet"]`)) found.setAttribute(attribute, id + /** @type {string} */ (found.getAttribute(attribute)).slice('one-sheet'.length));
    }
    const whole = /** @type {HTMLElement | null} */ (sheet.querySelector('[data-picture="field"]'));
    const section = packed.sections[Number(whole?.dataset.section)];
    const [f, at] = [numbers(whole?.dataset.forces), numbers(whole?.dataset.point)];
    for (const place of /** @type {NodeListOf<HTMLElement>} */ (sheet.querySelectorAll('[data-picture]'))) {
      const { picture: kind = '', words = '', labels = '', values } = place.dataset;
      const v = numbers(values), texts = labels.split('|');
      place.innerHTML = kind === 'field' ? large(section, f, at, id + '-f', words)
        : kind === 'alone' ? small(section, f, at, v[0], `${id}-${v[0]}`, words)
        : kind === 'mohr' ? mohr(/** @type {State} */ (v), texts, words)
        : kind === 'element' ? element(v[0], v[1], texts[3], texts, words)
        : kind === 'along' ? along((place.dataset.points ?? '').split('|').map(l => l.split(',').map(numbers)), v, texts, words)
        : kind === 'axes' ? axes(v, words) : '';
    }
  };

  let shown = 0;

  /**
   * Puts the sheet of a member into a container.
   * @param {HTMLElement} container emptied first
   * @param {string} key key of the member
   * @returns {Promise<boolean>} whether the page holds its sheet
   */
  memberScan.showSheet = async (container, key) => {
    const { packed, places } = await open();
    const place = places.get(key);
    container.textContent = '';
    if (!place) return false;
    const holder = document.createElement('div');
    holder.innerHTML = written(packed, packed.shapes[place[0]], place[1]);
    draw(holder, packed, `sheet-${++shown}`);
    container.append(...holder.childNodes);
    return true;
  };

  /** Gives each row that names a member a button for its sheet, unless the page does so itself. */
  const attach = () => {
    if (memberScan.ownsRows) return;
    for (const row of /** @type {NodeListOf<HTMLTableRowElement>} */ (document.querySelectorAll('tr[id^="member-"]'))) {
      const cell = row.querySelector('td:has(code)'), key = cell?.querySelector('code')?.textContent;
      if (!cell || !key) continue;
      const button = document.createElement('button');
      button.type = 'button';
      button.className = 'openSheet';
      button.textContent = 'sheet';
      button.setAttribute('aria-expanded', 'false');
      button.addEventListener('click', () => toggle(row, button, key));
      cell.append(button);
    }
  };

  /** @param {HTMLTableRowElement} row @param {HTMLButtonElement} button @param {string} key */
  const toggle = async (row, button, key) => {
    const next = /** @type {HTMLElement | null} */ (row.nextElementSibling);
    if (next?.classList.contains('sheetRow')) {
      next.hidden = !next.hidden;
      button.setAttribute('aria-expanded', String(!next.hidden));
      return;
    }
    const line = document.createElement('tr'), cell = document.createElement('td');
    line.className = 'sheetRow';
    cell.colSpan = row.cells.length;
    line.append(cell);
    row.after(line);
    button.setAttribute('aria-expanded', 'true');
    if (!await memberScan.showSheet(cell, key)) cell.textContent = 'No stress is known of the member, so there is no sheet; its row says why.';
  };

  if (document.readyState === 'loading') document.addEventListener('DOMContentLoaded', attach);
  else attach();
})();
