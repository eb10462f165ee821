// The members in space: true sections along straight axes, coloured by utilization, hatched where overstressed, dotted where not checked.
// Bundled with the package `three`; everything it draws comes from the block of all candidates.
import {
  BufferAttribute, BufferGeometry, Color, DoubleSide, GLSL3, Group, InstancedBufferAttribute, InstancedMesh, Matrix4, Path, PerspectiveCamera,
  Scene, ShaderMaterial, Shape, ShapeUtils, Vector2, Vector3, Vector4, WebGLRenderer, WebGLRenderTarget,
} from 'three';
import { OrbitControls } from 'three/examples/jsm/controls/OrbitControls.js';

const plain = 0;
const hatched = 1;
const dotted = 2;
const labelsOfWorst = 3;
const mostStoreys = 12;
const ground = '#fbfaf6';

// From afar true sections would be thinner than a pixel: they are drawn this many pixels thick at least, and the legend says so.
const leastThickness = 3;

// Sections that look smaller than this are drawn as boxes when more members are shown than the other number.
const boxPixels = 6;
const mostTrueSections = 2000;

// Time that a change of the filters rests before it is drawn [ms].
const showDelay = 100;

const vertexShader = `
  const float leastThickness = ${leastThickness.toFixed(1)};
  in float number;
  in float pattern;
  in vec3 tint;
  in float size;
  uniform float selected;
  uniform float pixel;
  out vec3 vColour;
  out vec3 vNormal;
  out vec3 vPlace;
  out float vAlong;
  out float vPattern;
  flat out float vSelected;
  flat out vec3 vNumber;
  void main() {
    vec4 axis = instanceMatrix * vec4(position.x, 0.0, 0.0, 1.0);
    float depth = max(-(viewMatrix * axis).z, 0.0);
    float thicker = max(1.0, leastThickness * pixel * depth / size);
    vec4 place = instanceMatrix * vec4(position.x, position.yz * thicker, 1.0);
    vPlace = place.xyz;
    vNormal = normalize(mat3(viewMatrix) * mat3(instanceMatrix) * normal);
    vColour = tint;
    vPattern = pattern;
    vSelected = abs(number - selected) < 0.5 ? 1.0 : 0.0;
    vAlong = length((instanceMatrix * vec4(position.x, 0.0, 0.0, 0.0)).xyz);
    float code = number + 1.0;
    vNumber = vec3(mod(code, 256.0), mod(floor(code / 256.0), 256.0), floor(code / 65536.0)) / 255.0;
    gl_Position = projectionMatrix * viewMatrix * place;
  }`;

// The hatch and the dots have a fixed size on the screen, so that they are seen from near and far.
const fragmentShader = `
  uniform vec4 cut;
  uniform float picking;
  in vec3 vColour;
  in vec3 vNormal;
  in vec3 vPlace;
  in float vAlong;
  in float vPattern;
  flat in float vSelected;
  flat in vec3 vNumber;
  out vec4 colour;
  void main() {
    if (dot(vPlace, cut.xyz) > cut.w) discard;
    if (picking > 0.5) { colour = vec4(vNumber, 1.0); return; }
    vec3 base = vColour;
    if (vPattern > 0.5 && vPattern < 1.5 && mod(gl_FragCoord.x + gl_FragCoord.y, 8.0) < 3.0) base = mix(base, vec3(1.0, 0.93, 0.85), 0.85);
    if (vPattern > 1.5 && mod(gl_FragCoord.x, 6.0) < 2.5 && mod(gl_FragCoord.y, 6.0) < 2.5) base = vec3(0.36, 0.33, 0.07);
    if (vSelected > 0.5) base = mix(base, vec3(0.95, 0.8, 0.15), 0.75);
    float light = 0.62 + 0.38 * abs(dot(normalize(vNormal), normalize(vec3(0.35, 0.55, 0.75))));
    colour = vec4(base * light, 1.0);
  }`;

/**
 * A bar of unit length along +x with the outline in y and z.
 * @param {number[][]} rings
 */
function barOf(rings) {
  /** @param {number[]} ring */
  const points = (ring) => Array.from({ length: ring.length / 2 }, (_, i) => new Vector2(ring[2 * i], ring[2 * i + 1]));
  const [outer, ...holes] = rings.map(points);
  if (ShapeUtils.isClockWise(outer)) outer.reverse();
  for (const hole of holes) if (!ShapeUtils.isClockWise(hole)) hole.reverse();
  const shape = new Shape(outer);
  shape.holes = holes.map((hole) => new Path(hole));

  /** @type {number[]} */
  const position = [];
  /** @type {number[]} */
  const normal = [];
  for (const ring of [outer, ...holes])
    ring.forEach((p, i) => {
      const q = ring[(i + 1) % ring.length];
      const [dy, dz] = [q.x - p.x, q.y - p.y];
      const size = Math.hypot(dy, dz) || 1;
      position.push(0, p.x, p.y, 1, p.x, p.y, 1, q.x, q.y, 0, p.x, p.y, 1, q.x, q.y, 0, q.x, q.y);
      for (let k = 0; k < 6; k++) normal.push(0, dz / size, -dy / size);
    });
  const all = [outer, ...holes].flat();
  for (const [a, b, c] of ShapeUtils.triangulateShape(outer, holes))
    for (const [x, order] of /** @type {[number, number[]][]} */ ([[0, [a, c, b]], [1, [a, b, c]]]))
      for (const i of order) {
        position.push(x, all[i].x, all[i].y);
        normal.push(x === 0 ? -1 : 1, 0, 0);
      }

  const geometry = new BufferGeometry();
  geometry.setAttribute('position', new BufferAttribute(new Float32Array(position), 3));
  geometry.setAttribute('normal', new BufferAttribute(new Float32Array(normal), 3));
  return geometry;
}

/** @param {number[][]} rings */
function sizeOf(rings) {
  return 2 * Math.max(...rings[0].map(Math.abs));
}

/**
 * The rectangle around an outline.
 * @param {number[][]} rings
 */
function boxOf(rings) {
  const [y, z] = [0, 1].map((k) => rings[0].filter((_, i) => i % 2 === k));
  const [y0, y1, z0, z1] = [Math.min(...y), Math.max(...y), Math.min(...z), Math.max(...z)];
  return [[y0, z0, y1, z0, y1, z1, y0, z1]];
}

/**
 * @param {string} tag
 * @param {string} style
 * @param {string} text
 */
function element(tag, style = '', text = '') {
  const made = document.createElement(tag);
  if (style) made.className = style;
  if (text) made.textContent = text;
  return made;
}

class Space {
  /**
   * @param {HTMLElement} container
   * @param {MemberData} data
   * @param {WebGL2RenderingContext} context
   * @param {HTMLCanvasElement} canvas
   */
  constructor(container, data, context, canvas) {
    this.container = container;
    this.data = data;
    this.canvas = canvas;
    this.renderer = new WebGLRenderer({ canvas, context, antialias: true, preserveDrawingBuffer: true });
    this.renderer.setPixelRatio(Math.min(devicePixelRatio, 2));
    this.scene = new Scene();
    this.scene.background = new Color(ground);
    this.camera = new PerspectiveCamera(40, 1, 0.01, 1e6);
    this.camera.up.set(0, 0, 1);
    this.controls = new OrbitControls(this.camera, canvas);
    this.controls.addEventListener('change', () => this.draw());
    this.controls.addEventListener('end', () => this.#moved());
    this.target = new WebGLRenderTarget(1, 1);
    this.picked = new Uint8Array(4);
    this.bars = new Group();
    this.scene.add(this.bars);
    this.lengths = data.number('length');
    this.starts = ['x0', 'y0', 'z0'].map((name) => data.drawn(name));
    this.along = ['xx', 'xy', 'xz'].map((name) => data.drawn(name));
    this.across = ['yx', 'yy', 'yz'].map((name) => data.drawn(name));
    this.material = new ShaderMaterial({
      glslVersion: GLSL3, side: DoubleSide, vertexShader, fragmentShader,
      uniforms: { selected: { value: -1 }, picking: { value: 0 }, pixel: { value: 1e-3 }, cut: { value: new Vector4(0, 0, 0, 1) } },
    });
    /** @type {{ place: Vector3, element: HTMLElement }[]} */
    this.labels = [];
    this.labelBox = element('div', 'labels');
    this.isWaiting = false;
    this.isSeen = false;
    this.isStale = true;
    this.placed = this.#placed();
    /** @type {ArrayLike<number>} */
    this.wanted = this.placed;
    this.box = this.#boxOf(this.placed);
    this.cutAxis = 'none';
  }

  #placed() {
    const found = [];
    for (let i = 0; i < this.data.count; i++) if (!Number.isNaN(this.starts[0][i])) found.push(i);
    return found;
  }

  /**
   * @param {number} index
   * @param {number} share
   */
  #point(index, share) {
    const length = this.lengths[index] * share;
    return new Vector3(...this.starts.map((start, k) => start[index] + length * this.along[k][index]));
  }

  /** @param {ArrayLike<number>} indices */
  #boxOf(indices) {
    const [least, most] = [new Vector3(Infinity, Infinity, Infinity), new Vector3(-Infinity, -Infinity, -Infinity)];
    for (let i = 0; i < indices.length; i++)
      for (const share of [0, 1]) {
        const point = this.#point(indices[i], share);
        if (Number.isNaN(point.x)) continue;
        least.min(point);
        most.max(point);
      }
    return { least, most };
  }

  /**
   * Draws these candidates and leaves the others out; a moment later, so that typing into a filter does not wait for the picture.
   * @param {ArrayLike<number>} indices
   */
  show(indices) {
    this.wanted = indices;
    this.isStale = true;
    clearTimeout(this.timer);
    this.timer = setTimeout(() => this.draw(), showDelay);
  }

  // Bars are built when somebody looks. True sections for what is near or for few; far ones of many as boxes, which at a few pixels look alike.
  #build() {
    if (!this.isStale) return;
    this.isStale = false;
    for (const mesh of [...this.bars.children]) {
      this.bars.remove(mesh);
      /** @type {InstancedMesh} */ (mesh).geometry.dispose();
      /** @type {InstancedMesh} */ (mesh).dispose();
    }

    const outline = this.data.text('outline');
    const sizes = this.data.outlines.map(sizeOf);
    const isMany = this.wanted.length > mostTrueSections;
    const place = new Vector3();
    let left = mostTrueSections;
    /** @type {Map<string, number[]>} */
    const groups = new Map();
    for (let i = 0; i < this.wanted.length; i++) {
      const index = this.wanted[i];
      if (Number.isNaN(this.starts[0][index])) continue;
      place.set(this.starts[0][index], this.starts[1][index], this.starts[2][index]);
      const reach = sizes[outline[index]] / (boxPixels * this.material.uniforms.pixel.value) + this.lengths[index];
      const isTrue = !isMany || (left > 0 && place.distanceTo(this.camera.position) < reach);
      if (isTrue) left--;
      const key = `${outline[index]} ${isTrue}`;
      const list = groups.get(key);
      if (list) list.push(index);
      else groups.set(key, [index]);
    }
    for (const [key, members] of groups) {
      const rings = this.data.outlines[Number.parseInt(key)];
      this.bars.add(this.#mesh(key.endsWith('true') ? rings : boxOf(rings), members));
    }
  }

  /**
   * @param {number[][]} rings
   * @param {number[]} members
   */
  #mesh(rings, members) {
    const geometry = barOf(rings);
    const mesh = new InstancedMesh(geometry, this.material, members.length);
    const steps = this.data.byte('step');
    const verdicts = this.data.byte('verdict');
    const colours = this.data.scale.map((step) => new Color().setStyle(step.colour, '').toArray());
    const [tint, pattern, number] = [new Float32Array(3 * members.length), new Float32Array(members.length), new Float32Array(members.length)];
    const size = new Float32Array(members.length).fill(sizeOf(rings));
    const matrix = new Matrix4();
    members.forEach((index, place) => {
      const x = new Vector3(...this.along.map((a) => a[index]));
      const y = new Vector3(...this.across.map((a) => a[index]));
      const z = new Vector3().crossVectors(x, y);
      matrix.makeBasis(x.multiplyScalar(this.lengths[index]), y, z).setPosition(this.#point(index, 0));
      mesh.setMatrixAt(place, matrix);
      tint.set(colours[steps[index]], 3 * place);
      pattern[place] = [plain, hatched, dotted][verdicts[index]];
      number[place] = index;
    });
    geometry.setAttribute('tint', new InstancedBufferAttribute(tint, 3));
    geometry.setAttribute('pattern', new InstancedBufferAttribute(pattern, 1));
    geometry.setAttribute('size', new InstancedBufferAttribute(size, 1));
    geometry.setAttribute('number', new InstancedBufferAttribute(number, 1));
    mesh.frustumCulled = false;
    return mesh;
  }

  /**
   * Turns the camera so that these candidates fill the picture.
   * @param {ArrayLike<number>} indices
   */
  fit(indices) {
    const { least, most } = this.#boxOf(indices.length > 0 ? indices : this.placed);
    if (!Number.isFinite(least.x)) return;
    const middle = least.clone().add(most).multiplyScalar(0.5);
    const direction = this.camera.position.clone().sub(this.controls.target);
    if (direction.lengthSq() < 1e-9) direction.set(0.45, -1, 0.4);
    const distance = this.#distanceFor(least, most, middle, direction.normalize());
    this.controls.target.copy(middle);
    this.camera.position.copy(middle).add(direction.multiplyScalar(distance));
    this.camera.near = distance / 1000;
    this.camera.far = distance * 100;
    this.camera.updateProjectionMatrix();
    this.controls.update();
    this.#moved();
  }

  /**
   * How far the camera must stand from the middle to see all corners of a box.
   * @param {Vector3} least
   * @param {Vector3} most
   * @param {Vector3} middle
   * @param {Vector3} direction From the middle to the camera, unit vector.
   */
  #distanceFor(least, most, middle, direction) {
    const [room, smallest] = [1.12, 1.2];
    const high = Math.tan((this.camera.fov * Math.PI) / 360) / room;
    const wide = high * this.camera.aspect;
    const right = new Vector3().crossVectors(this.camera.up, direction).normalize();
    const up = new Vector3().crossVectors(direction, right);
    let distance = smallest;
    for (let corner = 0; corner < 8; corner++) {
      const point = new Vector3(corner & 1 ? most.x : least.x, corner & 2 ? most.y : least.y, corner & 4 ? most.z : least.z).sub(middle);
      distance = Math.max(distance, point.dot(direction) + Math.max(Math.abs(point.dot(right)) / wide, Math.abs(point.dot(up)) / high));
    }
    return distance;
  }

  /** @param {number} index */
  select(index) {
    this.material.uniforms.selected.value = index;
    this.#labelMembers();
    this.draw();
  }

  /** Cuts away what lies beyond a share of the model along an axis. */
  cut() {
    const box = this.box;
    const axis = /** @type {HTMLSelectElement} */ (this.container.querySelector('[name="cut-axis"]')).value;
    const slider = /** @type {HTMLInputElement} */ (this.container.querySelector('[name="cut-at"]'));
    const value = this.material.uniforms.cut.value;
    const told = /** @type {HTMLOutputElement} */ (this.container.querySelector('output'));
    slider.disabled = axis === 'none';
    told.textContent = '';
    if (axis === 'none') value.set(0, 0, 0, 1);
    else {
      const share = Number(slider.value) / 100;
      const k = /** @type {'x' | 'y' | 'z'} */ (axis);
      const at = box.least[k] + share * (box.most[k] - box.least[k]) + (share >= 1 ? 1 : 0);
      value.set(k === 'x' ? 1 : 0, k === 'y' ? 1 : 0, k === 'z' ? 1 : 0, at);
      const unit = this.data.units.length;
      told.textContent = `${k.toUpperCase()} ${memberScan.figures.fixed((at + this.data.middle[['x', 'y', 'z'].indexOf(k)]) / unit.size, 3)} ${unit.symbol}`;
    }
    this.draw();
  }

  /**
   * The candidate under a place of the canvas; −1 for none. Drawn with numbers for colours, so cut and instances are minded.
   * @param {number} x
   * @param {number} y
   */
  pick(x, y) {
    this.#build();
    const { width, height } = this.canvas.getBoundingClientRect();
    this.camera.setViewOffset(width, height, x, y, 1, 1);
    this.material.uniforms.picking.value = 1;
    const background = this.scene.background;
    this.scene.background = null;
    this.renderer.setClearColor(0, 0);
    this.renderer.setRenderTarget(this.target);
    this.renderer.clear();
    this.renderer.render(this.scene, this.camera);
    this.renderer.readRenderTargetPixels(this.target, 0, 0, 1, 1, this.picked);
    this.renderer.setRenderTarget(null);
    this.scene.background = background;
    this.material.uniforms.picking.value = 0;
    this.camera.clearViewOffset();
    const [r, g, b] = this.picked;
    return r + 256 * g + 65536 * b - 1;
  }

  /**
   * Where a candidate's middle is seen, from the left and top of the canvas.
   * @param {number} index
   */
  placeOf(index) {
    const seen = this.#point(index, 0.5).project(this.camera);
    const { width, height } = this.canvas.getBoundingClientRect();
    return { x: ((seen.x + 1) / 2) * width, y: ((1 - seen.y) / 2) * height };
  }

  // After the camera has moved, other members are near.
  #moved() {
    if (this.wanted.length > mostTrueSections) this.isStale = true;
    this.draw();
  }

  draw() {
    if (this.isWaiting || !this.isSeen) return;
    this.isWaiting = true;
    requestAnimationFrame(() => {
      this.isWaiting = false;
      this.#build();
      this.renderer.render(this.scene, this.camera);
      this.#placeLabels();
    });
  }

  resize() {
    const { clientWidth: width, clientHeight: height } = /** @type {HTMLElement} */ (this.canvas.parentElement);
    if (width === 0 || height === 0) return;
    this.renderer.setSize(width, height, false);
    this.camera.aspect = width / height;
    this.material.uniforms.pixel.value = (2 * Math.tan((this.camera.fov * Math.PI) / 360)) / height;
    this.camera.updateProjectionMatrix();
    this.draw();
  }

  #labelStoreys() {
    /** @type {Map<number, number>} */
    const lowest = new Map();
    const storey = this.data.text('storey');
    for (const index of this.placed) {
      const level = Math.min(this.#point(index, 0).z, this.#point(index, 1).z);
      if (storey[index] > 0 && level < (lowest.get(storey[index]) ?? Infinity)) lowest.set(storey[index], level);
    }
    const unit = this.data.units.length;
    for (const [number, level] of [...lowest].sort((a, b) => a[1] - b[1]).slice(0, mostStoreys)) {
      const name = this.data.texts[number];
      const label = element('span', 'storey', `${[...name].slice(0, 24).join('')} ${memberScan.figures.fixed((level + this.data.middle[2]) / unit.size, 2)} ${unit.symbol}`);
      this.labels.push({ place: new Vector3(this.box.least.x, this.box.least.y, level), element: label });
    }
  }

  // The selected member and the worst of those shown carry their names.
  #labelMembers() {
    this.labels = [];
    this.#labelStoreys();
    const utilization = this.data.number('utilization');
    const verdicts = this.data.byte('verdict');
    const worst = this.placed.filter((i) => verdicts[i] === 1).sort((a, b) => utilization[b] - utilization[a]).slice(0, labelsOfWorst);
    const selected = this.placed.includes(memberScan.selected) ? [memberScan.selected] : [];
    for (const index of new Set([...selected, ...worst])) {
      const known = Number.isNaN(utilization[index]) ? '' : ' ' + memberScan.figures.utilization(utilization[index]);
      const name = [...this.data.textOf('name', index)].slice(0, 30).join('');
      const label = element('span', 'member' + (index === memberScan.selected ? ' selected' : ''), `${memberScan.words.symbols[verdicts[index]]} ${name}${known}`);
      this.labels.push({ place: this.#point(index, 0.5), element: label });
    }
    this.labelBox.replaceChildren(...this.labels.map((l) => l.element));
  }

  #placeLabels() {
    const { clientWidth: width, clientHeight: height } = this.canvas;
    for (const { place, element: label } of this.labels) {
      const seen = place.clone().project(this.camera);
      const isSeen = seen.z < 1 && Math.abs(seen.x) < 1 && Math.abs(seen.y) < 1;
      label.style.visibility = isSeen ? 'visible' : 'hidden';
      label.style.transform = `translate(${Math.round(((seen.x + 1) / 2) * width)}px, ${Math.round(((1 - seen.y) / 2) * height)}px)`;
    }
  }

  /** Controls, legend and what answers to mouse and keys. */
  furnish() {
    const stage = element('div', 'stage');
    this.canvas.tabIndex = 0;
    this.canvas.setAttribute('role', 'img');
    this.canvas.setAttribute('aria-label', 'Members in space, coloured by utilization. Click a member to select it; arrow keys turn the view, plus and minus bring it nearer or farther. Everything shown stands in the table too.');
    stage.append(this.canvas, this.labelBox);
    this.container.replaceChildren(this.#toolbar(), stage, this.#legend());
    new ResizeObserver(() => this.resize()).observe(stage);
    new IntersectionObserver((entries) => {
      this.isSeen = entries[entries.length - 1].isIntersecting;
      this.draw();
    }, { rootMargin: '50px' }).observe(stage);
    this.resize();
    this.#labelMembers();
    this.fit(this.placed);
    this.#listen();
  }

  #toolbar() {
    const bar = element('div', 'toolbar');
    /**
     * @param {string} text
     * @param {() => void} action
     */
    const button = (text, action) => {
      const made = element('button', '', text);
      made.setAttribute('type', 'button');
      made.addEventListener('click', action);
      bar.append(made);
    };
    button('Fit all', () => this.fit(this.placed));
    button('Fit shown', () => this.fit(memberScan.table?.shown ?? this.placed));
    button('Fit selection', () => this.fit(memberScan.selected < 0 ? this.placed : [memberScan.selected]));
    const label = element('label', '', 'Section plane ');
    const axis = /** @type {HTMLSelectElement} */ (element('select'));
    axis.name = 'cut-axis';
    axis.append(new Option('none', 'none'), new Option('X', 'x'), new Option('Y', 'y'), new Option('Z', 'z'));
    label.append(axis);
    const slider = /** @type {HTMLInputElement} */ (element('input'));
    Object.assign(slider, { type: 'range', name: 'cut-at', min: '0', max: '100', value: '60', disabled: true });
    slider.setAttribute('aria-label', 'Place of the section plane');
    for (const control of [axis, slider]) control.addEventListener('input', () => this.cut());
    bar.append(label, slider, element('output'));
    return bar;
  }

  #legend() {
    const list = element('ul', 'scale');
    list.setAttribute('aria-label', 'Colours by utilization');
    const steps = this.data.byte('step');
    const counts = this.data.scale.map(() => 0);
    for (const step of steps) counts[step]++;
    this.data.scale.forEach((step, i) => {
      const item = element('li');
      const swatch = element('span', `patch patch${i}`);
      swatch.setAttribute('aria-hidden', 'true');
      item.append(swatch, ` ${step.words}: ${memberScan.figures.count(counts[i])}`);
      list.append(item);
    });
    list.append(element('li', '', `bars thinner than ${leastThickness} pixels are drawn ${leastThickness} pixels thick; curved members and tapers as straight bars of one section; of more than ${memberScan.figures.count(mostTrueSections)} members the far ones as boxes`));
    const missing = this.data.count - this.placed.length;
    const outline = this.data.text('outline');
    const standIns = this.placed.filter((i) => outline[i] === 0).length;
    if (missing > 0) list.append(element('li', '', `without a known place, not drawn: ${memberScan.figures.count(missing)}`));
    if (standIns > 0) list.append(element('li', '', `section of unknown form, drawn as a square of 40 mm: ${memberScan.figures.count(standIns)}`));
    return list;
  }

  #listen() {
    let down = { x: 0, y: 0 };
    this.canvas.addEventListener('pointerdown', (event) => { down = { x: event.clientX, y: event.clientY }; });
    this.canvas.addEventListener('click', (event) => {
      if (Math.hypot(event.clientX - down.x, event.clientY - down.y) > 4) return;
      const { left, top } = this.canvas.getBoundingClientRect();
      memberScan.select(this.pick(event.clientX - left, event.clientY - top));
    });
    this.canvas.addEventListener('keydown', (event) => {
      const turn = Math.PI / 24;
      /** @type {Record<string, [number, number, number]>} */
      const moves = {
        ArrowLeft: [turn, 0, 1], ArrowRight: [-turn, 0, 1], ArrowUp: [0, turn, 1], ArrowDown: [0, -turn, 1], '+': [0, 0, 0.85], '-': [0, 0, 1 / 0.85],
      };
      const move = moves[event.key];
      if (!move) return;
      const offset = this.camera.position.clone().sub(this.controls.target);
      const [radius, azimuth] = [offset.length() * move[2], Math.atan2(offset.y, offset.x) + move[0]];
      const height = Math.min(Math.max(Math.asin(offset.z / offset.length()) + move[1], -1.5), 1.5);
      this.camera.position.copy(this.controls.target).add(
        new Vector3(radius * Math.cos(height) * Math.cos(azimuth), radius * Math.cos(height) * Math.sin(azimuth), radius * Math.sin(height)));
      this.controls.update();
      this.#moved();
      event.preventDefault();
    });
    memberScan.on('select', () => this.select(memberScan.selected));
    memberScan.on('filter', () => this.show(memberScan.table?.shown ?? this.placed));
    if (memberScan.selected >= 0) this.select(memberScan.selected);
    if (memberScan.table && memberScan.table.shown.length < this.data.count) this.show(memberScan.table.shown);
  }
}

memberScan.startView = (container, data) => {
  const canvas = document.createElement('canvas');
  const context = canvas.getContext('webgl2', { antialias: true, preserveDrawingBuffer: true });
  if (!context) return undefined;

  const space = new Space(container, data, context, canvas);
  if (space.placed.length === 0) {
    container.replaceChildren(element('p', 'remark', 'No view in space: the place of no member is known.'));
    return space;
  }

  container.hidden = false;
  space.furnish();
  document.getElementById('elevation')?.classList.add('replaced');
  return space;
};
