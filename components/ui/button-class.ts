export type ButtonTone = 'primary' | 'plain' | 'danger' | 'quiet';

const BASE =
  'inline-flex min-h-target items-center justify-center gap-2 rounded py-2 font-body font-semibold leading-tight no-underline transition-colors disabled:opacity-60 aria-disabled:opacity-60 print:hidden';
const TONES: Record<ButtonTone, string> = {
  // One a screen: brass under ink is the second ink of the board.
  primary: 'px-4 bg-brass text-on-brass border-2 border-on-brass/80 hover:border-ink',
  plain: 'px-4 border-2 border-pine text-pine bg-transparent hover:bg-pine hover:text-on-pine',
  danger: 'px-4 border-2 border-reed text-reed bg-transparent hover:bg-reed hover:text-board',
  quiet: 'text-lake underline underline-offset-4 px-1 hover:decoration-2',
};

export const buttonClass = (tone: ButtonTone, more = '') => `${BASE} ${TONES[tone]} ${more}`;
