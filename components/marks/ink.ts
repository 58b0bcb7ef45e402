/** One pixel of the screen, from the upper left of the canvas. */
interface Pixel {
  x: number;
  y: number;
}

/** Edge and ink, as in the shapes of marks: the light edge shows on dark cloth, the dark ink on light. */
const EDGE = { colour: '#fffdf6', widthPx: 7 };
const INK = { colour: '#10151c', widthPx: 3 };
/** So much of the line is inked again, because the edge of a new piece lies over the end of the old one. */
const AGAIN_PX = 10;

function draw(context: CanvasRenderingContext2D, line: readonly Pixel[], { colour, widthPx }: typeof INK) {
  context.beginPath();
  for (const { x, y } of line) context.lineTo(x, y);
  context.strokeStyle = colour;
  context.lineWidth = widthPx;
  context.stroke();
}

/** The end of a line, at least so many pixels of it. */
function endOf(line: readonly Pixel[], lengthPx: number): Pixel[] {
  let from = line.length - 1;
  for (let length = 0; from > 0 && length < lengthPx; from -= 1) {
    const [a, b] = [line[from - 1]!, line[from]!];
    length += Math.hypot(b.x - a.x, b.y - a.y);
  }
  return line.slice(Math.max(0, from));
}

/** Wet ink: each piece is drawn as it comes, so that its cost does not grow with the stroke. */
export interface Ink {
  /** Clears the canvas and fits it to the screen. */
  begin: () => void;
  /** Draws from the last point on through these. */
  extend: (pixels: readonly Pixel[]) => void;
  end: () => void;
}

/** Ink that goes past the page's own drawing to the screen where the browser can, so that it keeps up with the hand. */
export function inkOn(canvas: HTMLCanvasElement): Ink {
  const context = canvas.getContext('2d', { desynchronized: true });
  let tail: Pixel[] = [];
  const clear = () => context?.clearRect(0, 0, canvas.width, canvas.height);
  return {
    begin: () => {
      tail = [];
      const ratio = window.devicePixelRatio || 1;
      canvas.width = Math.round(canvas.clientWidth * ratio);
      canvas.height = Math.round(canvas.clientHeight * ratio);
      context?.scale(ratio, ratio);
    },
    extend: (pixels) => {
      const line = [...tail, ...pixels];
      if (context && line.length > 1) {
        context.lineCap = 'round';
        context.lineJoin = 'round';
        draw(context, line.slice(Math.max(0, tail.length - 1)), EDGE);
        draw(context, line, INK);
      }
      tail = endOf(line, AGAIN_PX);
    },
    end: () => {
      tail = [];
      clear();
    },
  };
}
