import { listWords } from '../shared/list-words';
import { askSentence } from './ask-sentence';
import { type HarpNeed, isAnyKey } from './harp-ask';

/** One thing to bring in words: `A harp or D harp`, `song in E, 2nd position → A harp (helpful)`, `a harp of any key`. */
export function needSentence(need: HarpNeed): string {
  const what = isAnyKey(need) ? 'a harp of any key' : listWords(need.anyOf.map(askSentence), 'or');
  const level = need.level === 'helpful' ? ' (helpful)' : '';
  return `${what}${level}${need.note ? `: ${need.note}` : ''}`;
}
