/** One pixel of the screen, from the upper left of the canvas. */
interface Pixel {
  x: number;
  y: number;
}

/** Edge and ink, as in the shapes of marks: the light edge shows on dark cloth, the dark ink on light. */
const PASSES = [
  { colour: '#fffdf6', widthPx: 7 },
  { colour: '#10151c', widthPx: 3 },
] as const;

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
      // Two points are drawn again, so that the edge of the new piece does not lie on the ink of the old one.
      tail = line.slice(-3);
      if (!context || line.length < 2) return;
      context.lineCap = 'round';
      context.lineJoin = 'round';
      for (const { colour, widthPx } of PASSES) {
        context.beginPath();
        for (const { x, y } of line) context.lineTo(x, y);
        context.strokeStyle = colour;
        context.lineWidth = widthPx;
        context.stroke();
      }
    },
    end: () => {
      tail = [];
      clear();
    },
  };
}
