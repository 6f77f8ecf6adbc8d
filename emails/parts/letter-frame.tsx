import { Body, Container, Head, Heading, Html, Preview, Section, Text } from '@react-email/components';
import type { ReactNode } from 'react';
import { LETTER } from './letter-look';

type LetterFrameProps = {
  /** The line that lists of mail show beside the subject. */
  preview: string;
  title: string;
  children: ReactNode;
  /** Why they got it and whom to ask, at the end. */
  foot: ReactNode;
};

// Programs that know dark mode get our night colours; the others see the day ones, or turn them round by themselves,
// which this keeps harmless: no pictures but the codes, and no colour that means something alone.
const NIGHT = `
  :root { color-scheme: light dark; supported-color-schemes: light dark; }
  @media (prefers-color-scheme: dark) {
    .board { background: #12201f !important; }
    .ink, .ink * { color: #eef2ec !important; }
    .soft, .soft * { color: #b9c6c0 !important; }
    .brass, .brass * { color: #14211f !important; }
    .white { background: #ffffff !important; }
  }`;

/** One column, big text, no picture from outside, no font to fetch: it reads the same in every program. */
export function LetterFrame({ preview, title, children, foot }: LetterFrameProps) {
  return (
    <Html lang="en" dir="auto">
      <Head>
        <meta name="color-scheme" content="light dark" />
        <meta name="supported-color-schemes" content="light dark" />
        <style>{NIGHT}</style>
      </Head>
      <Preview>{preview}</Preview>
      {/* The ground is a table of ours: Body would paint an inner cell that no class reaches, and night would be white. */}
      <Body className="board" style={{ margin: 0 }}>
        <Section className="board" style={{ background: LETTER.board }}>
          <Container
            className="ink"
            style={{ maxWidth: 600, margin: '0 auto', padding: '24px 12px', fontFamily: LETTER.font }}
          >
            <Heading as="h1" style={{ ...LETTER.head, fontSize: 30, margin: '0 0 20px' }}>
              {title}
            </Heading>
            {children}
            <Section className="soft" style={{ marginTop: 32, borderTop: `1px solid ${LETTER.edge}` }}>
              <Text style={{ ...LETTER.small, margin: '12px 0 0' }}>{foot}</Text>
            </Section>
          </Container>
        </Section>
      </Body>
    </Html>
  );
}
