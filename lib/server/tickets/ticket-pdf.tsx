import 'server-only';
import { Document, Page, Path, Rect, renderToBuffer, Svg, View } from '@react-pdf/renderer';
import { sayDay, sayDays } from '@/lib/domain/shared/say-date';
import type { OrderPerson, OrderView } from '../orders/load-order';
import { PdfText } from '../pdf/pdf-text';

import { ticketQr } from './ticket-qr';
import { ticketText } from './ticket-text';

const MM = 72 / 25.4;
// A module of 1.3 mm: a phone reads it from half a metre, and a crease costs less than level M gives.
const CODE = 70 * MM;

/** One A5 page for each attendee with a valid ticket; prints on A4 as well. Null when nobody has one. */
export async function ticketPdf(view: OrderView, only?: OrderPerson['id']): Promise<Buffer | null> {
  const people = view.registrations.filter(({ id, ticket }) => ticket && (only === undefined || id === only));
  if (people.length === 0) return null;
  const title = `Ticket ${view.order.reference}, ${view.camp.name}`;
  return renderToBuffer(
    <Document
      title={title}
      author={view.organisation.name}
      creator="Combwood"
      producer="Combwood"
      language="en"
    >
      {people.map((person) => (
        <TicketPage key={person.id} view={view} person={person} />
      ))}
    </Document>,
  );
}

function TicketPage({ view, person }: { view: OrderView; person: OrderPerson }) {
  const { camp, organisation, order } = view;
  if (!person.ticket) return null;
  const code = ticketQr(ticketText(person.ticket));
  return (
    <Page size="A5" style={{ padding: 12 * MM, backgroundColor: '#ffffff' }}>
      <View style={{ borderBottom: '1.5pt solid #14211f', paddingBottom: 6 }}>
        <PdfText face="head" style={{ fontSize: 22, lineHeight: 1.1 }}>
          {camp.name}
        </PdfText>
        <PdfText style={{ fontSize: 12, marginTop: 4 }}>{sayDays(camp.startsOn, camp.endsOn)}</PdfText>
        <PdfText style={{ color: '#42524e' }}>
          {[camp.venueName, camp.venueAddress].filter(Boolean).join(', ')}
        </PdfText>
      </View>
      <PdfText style={{ fontSize: 22, lineHeight: 1.3, marginTop: 8 }}>{person.attendeeName}</PdfText>
      <PdfText style={{ fontSize: 13 }}>{`Track ${person.trackName}`}</PdfText>
      <View style={{ flexDirection: 'row', marginTop: 8, marginLeft: -4 * MM }}>
        <Svg width={CODE} height={CODE} viewBox={`0 0 ${code.size} ${code.size}`}>
          <Rect x={0} y={0} width={code.size} height={code.size} fill="#ffffff" />
          <Path d={code.path} fill="#000000" />
        </Svg>
        <View style={{ flex: 1, paddingLeft: 4, justifyContent: 'center' }}>
          <PdfText style={{ color: '#42524e', fontSize: 10 }}>Booking reference</PdfText>
          <PdfText face="mono" style={{ fontSize: 15 }}>
            {order.reference}
          </PdfText>
          <PdfText style={{ color: '#42524e', fontSize: 10, marginTop: 8 }}>Door opens</PdfText>
          <PdfText>{`${sayDay(camp.startsOn)}, ${camp.arrivalFrom} (${camp.timeZone})`}</PdfText>
        </View>
      </View>
      <View style={{ marginTop: 6 }}>
        <PdfText face="head" style={{ fontSize: 13 }}>
          At the door
        </PdfText>
        <PdfText>
          Show this code, on paper or on a phone. It lets in one person, once. If it does not read or you lose
          it, say your name.
        </PdfText>
        {person.minor ? (
          <PdfText style={{ marginTop: 4 }}>
            Under 18: come with the guardian who was named, or call the organiser first.
          </PdfText>
        ) : null}
        <PdfText style={{ marginTop: 4 }}>
          Your packing list says which harps to bring. Play your own, and never share one.
        </PdfText>
      </View>
      <PdfText
        style={{
          position: 'absolute',
          bottom: 9 * MM,
          left: 12 * MM,
          right: 12 * MM,
          fontSize: 9,
          color: '#42524e',
        }}
      >
        {`${organisation.name}, ${organisation.email}. Fold the sheet beside the code, not across it.`}
      </PdfText>
    </Page>
  );
}
