// Numbers as the report prints them, by the same rules as its fixed part: point as decimal mark, thin-space groups, true minus sign.
'use strict';

(() => {
  const significantFigures = 4;
  const utilizationDecimals = 3;
  const mostUtilizationDecimals = 12;
  const negligible = 1e-9;
  const groupSpace = '\u202F';
  const minus = '\u2212';
  const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

  /** @param {string} plain */
  function signed(plain) {
    if (plain[0] !== '-') return plain;
    return /[1-9]/.test(plain) ? minus + plain.slice(1) : plain.slice(1);
  }

  /** @param {string} plain */
  function grouped(plain) {
    const [, sign, whole, rest] = /** @type {RegExpExecArray} */ (/^(-?)(\d+)(.*)$/.exec(plain));
    const shown = whole.length < 5 ? whole : whole.replace(/\B(?=(\d{3})+$)/g, groupSpace);
    return signed(sign + shown + rest);
  }

  // The fixed part rounds what lies exactly halfway to the even digit, the functions of the language away from zero.
  // `longer` has one digit more than wanted; `exact` so many that every double of a shown size is whole in it.
  /**
   * @param {string} rounded
   * @param {string} longer
   * @param {() => string} exact
   */
  function toEven(rounded, longer, exact) {
    if (!longer.endsWith('5')) return rounded;
    const cut = longer.slice(0, -1).replace(/\.$/, '');
    const isHalfway = /^50*$/.test(exact().slice(longer.length - 1));
    return isHalfway && '02468'.includes(cut[cut.length - 1]) ? cut : rounded;
  }

  /**
   * A number of fixed decimals without an exponent, whatever its size.
   * @param {number} value
   * @param {number} decimals
   */
  function plain(value, decimals) {
    if (Math.abs(value) >= 1e21) return BigInt(value).toString() + (decimals > 0 ? '.' + '0'.repeat(decimals) : '');
    return toEven(value.toFixed(decimals), value.toFixed(decimals + 1), () => value.toFixed(decimals + 60));
  }

  /** @param {number} value */
  function significant(value) {
    if (value === 0) return '0';
    const [up, power] = value.toExponential(significantFigures - 1).split('e');
    const mantissa = toEven(up, value.toExponential(significantFigures).split('e')[0], () => value.toExponential(60).split('e')[0]);
    const exponent = Number(power);
    if (exponent < -4 || exponent > 14)
      return signed(mantissa) + '×10' + (exponent < 0 ? '⁻' : '') + [...String(Math.abs(exponent))].map((digit) => superscripts[Number(digit)]).join('');
    return grouped(plain(Number(`${mantissa}e${power}`), Math.max(0, significantFigures - 1 - exponent)));
  }

  /**
   * @param {number} value
   * @param {number} decimals
   */
  function fixed(value, decimals) {
    return grouped(plain(value, decimals));
  }

  /** @param {number} value */
  function utilization(value) {
    const atLimit = (/** @type {string} */ text) => text.replace(/0+$/, '') === '1.';
    let decimals = utilizationDecimals;
    let text = fixed(value, decimals);
    while (value !== 1 && atLimit(text) && decimals < mostUtilizationDecimals) text = fixed(value, ++decimals);
    return atLimit(text) ? fixed(1, utilizationDecimals) : text;
  }

  memberScan.figures = {
    significant,
    fixed,
    utilization,
    count: (value) => grouped(String(value)),
    inUnit(si, unit) {
      const shown = si / unit.size;
      return shown !== 0 && Math.abs(shown) < negligible ? '≈\u00A00' : significant(shown);
    },
  };
})();
