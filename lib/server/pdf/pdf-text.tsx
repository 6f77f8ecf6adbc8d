import 'server-only';
import { Text } from '@react-pdf/renderer';
import type { ComponentProps } from 'react';
import { drawable, familiesFor, HEAD_FAMILY, MONO_FAMILY } from './pdf-fonts';

type Style = Exclude<ComponentProps<typeof Text>['style'], readonly unknown[] | undefined>;
type PdfTextProps = { children: string; face?: 'head' | 'mono'; style?: Style };

const FIRST = { head: HEAD_FAMILY, mono: MONO_FAMILY } as const;

/** A line or paragraph in the faces that its letters need. */
export function PdfText({ children, face, style }: PdfTextProps) {
  const text = drawable(children);
  // The types know one family; the renderer takes a list and falls back by glyph.
  const fontFamily = familiesFor(text, face && FIRST[face]) as unknown as string;
  return (
    <Text style={{ fontSize: 12, lineHeight: 1.45, color: '#14211f', ...style, fontFamily }}>{text}</Text>
  );
}
