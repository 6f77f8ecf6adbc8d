/** One landscape sheet: type as large as fits (`--sheet-type`), a card on two lines, lanes with nothing in them left out. */
export const PRINT_ON_ONE_SHEET = `
@media print {
  @page { size: A4 landscape; margin: 7mm; }
  main > header, .no-print { display: none !important; }
  main { padding: 0 !important; }
  .timetable-sheet { border: 0; font-size: 9pt; line-height: 1.15; }
  .timetable-sheet table { font-size: var(--sheet-type); line-height: 1.15; table-layout: fixed; }
  .timetable-sheet th, .timetable-sheet td { padding: 0.3mm 0.6mm; font-size: inherit; }
  .timetable-sheet th:nth-child(1), .timetable-sheet th:nth-child(2) { width: 20mm; }
  .timetable-sheet tr { break-inside: avoid; }
  .timetable-sheet tr[data-empty="true"] td, .timetable-sheet tr[data-empty="true"] th[scope="row"] { display: none; }
  .timetable-sheet article { display: block; border-width: 0 0 0 0.6mm; border-radius: 0; margin: 0; padding: 0 0 0 0.8mm; background: none; }
  .timetable-sheet article * { font-size: inherit; line-height: inherit; min-height: 0; }
  .timetable-sheet article h3, .timetable-sheet article ul, .timetable-sheet article li { display: inline; }
  .timetable-sheet article li { border: 0; padding: 0 0 0 0.8mm; background: none; font-weight: 400; }
  .timetable-sheet article li + li::before { content: "+ "; }
  .timetable-sheet article .sr-only { display: none; }
  .timetable-sheet a { color: inherit; text-decoration: none; }
}
`;
