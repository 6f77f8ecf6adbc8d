import { Button, Heading, Section, Text } from '@react-email/components';
import { Fragment, type ReactNode } from 'react';
import { LETTER } from './letter-look';

export function Para({ children }: { children: ReactNode }) {
  return <Text style={LETTER.text}>{children}</Text>;
}

export function Small({ children }: { children: ReactNode }) {
  return (
    <Text className="soft" style={{ ...LETTER.small, margin: '0 0 16px' }}>
      {children}
    </Text>
  );
}

export function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <Section style={{ marginTop: 28 }}>
      <Heading as="h2" style={{ ...LETTER.head, fontSize: 22, margin: '0 0 12px' }}>
        {title}
      </Heading>
      {children}
    </Section>
  );
}

/** The one thing to press. */
export function PressLink({ href, children }: { href: string; children: ReactNode }) {
  return (
    <Section style={{ margin: '24px 0' }}>
      <Button className="brass" href={href} style={LETTER.button}>
        {children}
      </Button>
    </Section>
  );
}

/** A text as it was typed: blank lines part paragraphs, and a line stays a line. */
export function Lines({ text }: { text: string }) {
  const paragraphs = text.split(/\n\s*\n/).filter((part) => part.trim());
  return paragraphs.map((part) => (
    <Para key={part}>
      {part
        .trim()
        .split(/\r?\n/)
        .map((line) => (
          <Fragment key={line}>
            {line}
            <br />
          </Fragment>
        ))}
    </Para>
  ));
}
