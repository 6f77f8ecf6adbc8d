import 'server-only';
import { Document, Page, renderToBuffer, View } from '@react-pdf/renderer';
import { formatMoney } from '@/lib/domain/shared/money';
import { sayDays, sayInstant } from '@/lib/domain/shared/say-date';
import { PdfText } from '../pdf/pdf-text';
import type { OrderView } from './load-order';

const MARGIN = 56;

/** A receipt for one payment: what was paid, by whom, for what. Null when the order has no receipt of that number. */
export async function receiptPdf(view: OrderView, number: number): Promise<Buffer | null> {
  const receipt = view.receipts.find((known) => known.number === number);
  if (!receipt) return null;
  const { organisation, order, camp, lines } = view;
  const money = (amount: typeof receipt.amount) => formatMoney(amount, receipt.currency);
  return renderToBuffer(
    <Document
      title={`Receipt ${number}, ${organisation.name}`}
      author={organisation.name}
      creator="Combwood"
      producer="Combwood"
      language="en"
    >
      <Page size="A4" style={{ padding: MARGIN, backgroundColor: '#ffffff' }}>
        <PdfText face="head" style={{ fontSize: 26, lineHeight: 1.1 }}>{`Receipt ${number}`}</PdfText>
        <PdfText style={{ marginTop: 6 }}>{organisation.name}</PdfText>
        <PdfText style={{ color: '#42524e' }}>{organisation.email}</PdfText>
        <View style={{ marginTop: 24 }}>
          <Fact name="Paid on" value={sayInstant(receipt.issuedAt, camp.timeZone)} />
          <Fact name="Paid by" value={order.payerName} />
          <Fact name="Booking reference" value={order.reference} />
          <Fact name="For" value={`${camp.name}, ${sayDays(camp.startsOn, camp.endsOn)}`} />
        </View>
        <View style={{ marginTop: 24, borderTop: '1.5pt solid #14211f' }}>
          {lines.map((line) => (
            <Row key={line.id} name={line.label} amount={money(line.amount)} />
          ))}
          <Row name="Total of the booking" amount={money(order.total)} />
          <Row name="Paid with this receipt" amount={money(receipt.amount)} strong />
        </View>
        <PdfText style={{ marginTop: 24, fontSize: 10, color: '#42524e' }}>
          This is a receipt for a payment. It says nothing about tax; ask the organiser for an invoice if you
          need one.
        </PdfText>
      </Page>
    </Document>,
  );
}

function Fact({ name, value }: { name: string; value: string }) {
  return (
    <View style={{ flexDirection: 'row', marginBottom: 3 }}>
      <PdfText style={{ width: 130, color: '#42524e' }}>{name}</PdfText>
      <PdfText style={{ flex: 1 }}>{value}</PdfText>
    </View>
  );
}

function Row({ name, amount, strong = false }: { name: string; amount: string; strong?: boolean }) {
  return (
    <View style={{ flexDirection: 'row', borderBottom: '0.5pt solid #6a7874', paddingVertical: 5 }}>
      <PdfText face={strong ? 'head' : undefined} style={{ flex: 1, paddingRight: 16 }}>
        {name}
      </PdfText>
      <PdfText face="mono">{amount}</PdfText>
    </View>
  );
}
