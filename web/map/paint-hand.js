/** @typedef {import("./frame.js").Frame} Frame */
/** @typedef {import("./inks.js").Inks} Inks */
/** @typedef {import("./projected.js").Spot} Spot */

/**
 * @typedef {object} AtHand what is at hand, to be drawn above the plant
 * @property {Float64Array | null} path the path's track on the world's square
 * @property {Float64Array | null} line the thing that is open, where it is a line
 * @property {Spot | null} place the thing that is open, where it is a place
 * @property {string} label of the thing that is open
 * @property {Spot | null} pointer the place pointed at on the path
 * @property {string} pointed what is said beside the pointer
 */

/**
 * Lines at hand, in the one accent: below the structures, so that their tags stay readable.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {AtHand} hand
 */
export function paintHandLines(canvas, frame, inks, hand) {
  if (hand.path) stroke(canvas, frame, inks, hand.path);
  if (hand.line) stroke(canvas, frame, inks, hand.line);
}

/**
 * Signs at hand: the letters, brackets and rings that say the same without colour.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {AtHand} hand
 */
export function paintHandSigns(canvas, frame, inks, hand) {
  if (hand.path) {
    letter(canvas, frame, inks, hand.path, 0, "a");
    letter(canvas, frame, inks, hand.path, hand.path.length - 2, "z");
  }
  if (hand.place) brackets(canvas, frame, inks, hand.place, hand.label);
  if (hand.pointer) pointer(canvas, frame, inks, hand.pointer, hand.pointed);
}

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {Float64Array} line
 */
function stroke(canvas, frame, inks, line) {
  canvas.lineJoin = "round";
  canvas.lineCap = "round";
  canvas.beginPath();
  frame.trace(canvas, line);
  canvas.globalAlpha = 0.85;
  canvas.strokeStyle = inks.paper;
  canvas.lineWidth = 7;
  canvas.stroke();
  canvas.globalAlpha = 1;
  canvas.strokeStyle = inks.accent;
  canvas.lineWidth = 4;
  canvas.stroke();
  canvas.strokeStyle = inks.paper;
  canvas.lineWidth = 1;
  canvas.stroke();
  canvas.lineCap = "butt";
}

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {Float64Array} line
 * @param {number} index of the point's x
 * @param {string} text
 */
function letter(canvas, frame, inks, line, index, text) {
  const x = frame.x(line[index] ?? 0);
  const y = frame.y(line[index + 1] ?? 0) - 20;
  canvas.beginPath();
  canvas.arc(x, y, 9, 0, Math.PI * 2);
  canvas.fillStyle = inks.accent;
  canvas.fill();
  canvas.font = `700 12px ${inks.font}`;
  canvas.textAlign = "center";
  canvas.textBaseline = "middle";
  canvas.fillStyle = inks.paper;
  canvas.fillText(text, x, y);
}

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {Spot} place
 * @param {string} label
 */
function brackets(canvas, frame, inks, place, label) {
  const x = frame.x(place.x);
  const y = frame.y(place.y);
  const [half, arm] = [22, 8];
  canvas.beginPath();
  for (const [sx, sy] of /** @type {Array<[number, number]>} */ ([[-1, -1], [1, -1], [1, 1], [-1, 1]])) {
    canvas.moveTo(x + sx * half, y + sy * (half - arm));
    canvas.lineTo(x + sx * half, y + sy * half);
    canvas.lineTo(x + sx * (half - arm), y + sy * half);
  }
  canvas.strokeStyle = inks.accent;
  canvas.lineWidth = 2.5;
  canvas.stroke();
  said(canvas, inks, label, x, y - half - 10, "center");
}

/**
 * @param {CanvasRenderingContext2D} canvas
 * @param {Frame} frame
 * @param {Inks} inks
 * @param {Spot} spot
 * @param {string} text
 */
function pointer(canvas, frame, inks, spot, text) {
  const x = frame.x(spot.x);
  const y = frame.y(spot.y);
  canvas.beginPath();
  canvas.arc(x, y, 8, 0, Math.PI * 2);
  canvas.fillStyle = inks.paper;
  canvas.fill();
  canvas.strokeStyle = inks.accent;
  canvas.lineWidth = 2;
  canvas.stroke();
  canvas.beginPath();
  for (const [dx, dy] of /** @type {Array<[number, number]>} */ ([[1, 0], [-1, 0], [0, 1], [0, -1]])) {
    canvas.moveTo(x + dx * 4, y + dy * 4);
    canvas.lineTo(x + dx * 14, y + dy * 14);
  }
  canvas.stroke();
  said(canvas, inks, text, x + 18, y - 14, "left");
}

/**
 * Words on the map, on a ground of paper.
 * @param {CanvasRenderingContext2D} canvas
 * @param {Inks} inks
 * @param {string} text
 * @param {number} x
 * @param {number} y
 * @param {"left" | "center"} align
 */
export function said(canvas, inks, text, x, y, align) {
  if (!text) return;
  canvas.font = `600 12px ${inks.font}`;
  const width = canvas.measureText(text).width;
  const left = align === "center" ? x - width / 2 : x;
  canvas.fillStyle = inks.paper;
  canvas.globalAlpha = 0.92;
  canvas.fillRect(left - 4, y - 9, width + 8, 18);
  canvas.globalAlpha = 1;
  canvas.textAlign = "left";
  canvas.textBaseline = "middle";
  canvas.fillStyle = inks.ink;
  canvas.fillText(text, left, y + 0.5);
}
