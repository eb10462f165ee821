// Reads the block of all candidates: base 64, zlib, a head in JSON, columns behind it.
'use strict';

(() => {
  /**
   * @param {string} base64
   * @returns {Uint8Array<ArrayBuffer>}
   */
  function bytesOf(base64) {
    if (Uint8Array.fromBase64) return Uint8Array.fromBase64(base64);
    const text = atob(base64);
    const bytes = new Uint8Array(text.length);
    for (let i = 0; i < text.length; i++) bytes[i] = text.charCodeAt(i);
    return bytes;
  }

  /** @param {Uint8Array<ArrayBuffer>} packed */
  async function unpacked(packed) {
    const stream = new Blob([packed]).stream().pipeThrough(new DecompressionStream('deflate'));
    return new Response(stream).arrayBuffer();
  }

  memberScan.readBlock = async (base64) => {
    const buffer = await unpacked(bytesOf(base64.trim()));
    const headLength = new DataView(buffer).getInt32(0, true);
    /** @type {BlockHead} */
    const head = JSON.parse(new TextDecoder().decode(new Uint8Array(buffer, 4, headLength)));
    const start = Math.ceil((4 + headLength) / 8) * 8;

    /**
     * @template T
     * @param {string} name
     * @param {string} type
     * @param {new (buffer: ArrayBuffer, at: number, length: number) => T} kind
     * @returns {T}
     */
    function column(name, type, kind) {
      const place = head.columns[name];
      if (!place || place.type !== type) throw new Error(`The data of this page hold no column '${name}' of kind '${type}'.`);
      return new kind(buffer, start + place.at, head.count);
    }

    return {
      ...head,
      text: (name) => column(name, 'text', Uint32Array),
      number: (name) => column(name, 'number', Float64Array),
      drawn: (name) => column(name, 'drawn', Float32Array),
      byte: (name) => column(name, 'byte', Uint8Array),
      textOf: (name, index) => head.texts[column(name, 'text', Uint32Array)[index]],
    };
  };
})();
