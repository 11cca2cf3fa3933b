import { Body, Button, Container, Head, Heading, Html, Preview, Text } from '@react-email/components';

/** What a mail says; the same for every kind. */
export interface Letter {
  readonly heading: string;
  readonly paragraphs: readonly string[];
  readonly link?: { readonly href: string; readonly label: string };
  /** small print below the link */
  readonly footing: string;
}

const INK = '#0f2a2e';
const text = { color: INK, fontSize: '16px', lineHeight: '24px', margin: '0 0 14px' };
const small = { ...text, color: '#47605f', fontSize: '13px', lineHeight: '19px' };
const sheet = {
  backgroundColor: '#ffffff',
  border: '1px solid #cfdbd7',
  borderRadius: '4px',
  padding: '28px',
  maxWidth: '520px',
};
const button = {
  backgroundColor: INK,
  borderRadius: '3px',
  color: '#ffffff',
  display: 'inline-block',
  fontSize: '16px',
  fontWeight: 600,
  padding: '11px 18px',
};

export function LetterMail({ letter, club }: { letter: Letter; club: string }) {
  const { heading, paragraphs, link, footing } = letter;
  return (
    <Html lang="en">
      <Head />
      <Preview>{paragraphs[0] ?? heading}</Preview>
      <Body
        style={{
          backgroundColor: '#e6eeeb',
          fontFamily: 'Helvetica, Arial, sans-serif',
          padding: '24px 8px',
        }}
      >
        <Container style={sheet}>
          <Heading as="h1" style={{ color: INK, fontSize: '24px', lineHeight: '30px', margin: '0 0 16px' }}>
            {heading}
          </Heading>
          {paragraphs.map((paragraph) => (
            <Text key={paragraph} style={text}>
              {paragraph}
            </Text>
          ))}
          {link && (
            <>
              <Button href={link.href} style={button}>
                {link.label}
              </Button>
              <Text style={{ ...small, marginTop: '14px', wordBreak: 'break-all' }}>{link.href}</Text>
            </>
          )}
          <Text style={{ ...small, margin: '18px 0 0' }}>
            {footing} Sent by the Bendwell of {club}.
          </Text>
        </Container>
      </Body>
    </Html>
  );
}
