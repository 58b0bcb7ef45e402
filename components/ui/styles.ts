/** Joins class names, leaving out what is not there. */
export const join = (...names: (string | false | null | undefined)[]) => names.filter(Boolean).join(' ');

const BUTTON = 'inline-flex min-h-11 items-center justify-center gap-2 rounded-md px-4 py-2 font-bold no-underline disabled:opacity-60'; // prettier-ignore
const LOOKS = {
  chalk: 'bg-chalk text-on-chalk hover:bg-chalk-deep',
  plain: 'border-2 border-line bg-paper text-ink hover:border-ink',
  quiet: 'text-chalk underline decoration-2 underline-offset-4 hover:text-chalk-deep',
  danger: 'border-2 border-pin bg-paper text-pin hover:bg-weave',
} as const;

export type ButtonLook = keyof typeof LOOKS;
export const buttonClass = (look: ButtonLook, extra?: string) => join(BUTTON, LOOKS[look], extra);

export const FIELD = 'min-h-11 w-full rounded-md border-2 border-line bg-paper px-3 py-2 text-ink placeholder:text-graphite focus-visible:outline-offset-1 aria-invalid:border-pin'; // prettier-ignore
