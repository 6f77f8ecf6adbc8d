/**
 * One landscape sheet, whatever the camp's size: type shrinks with the number of lanes in use, and lanes with nothing in
 * them are left out. A lane of two lines is about 2.6 times its type's size.
 */
export const PRINT_ON_ONE_SHEET = `
@media print {
  @page { size: A4 landscape; margin: 7mm; }
  header:not(.timetable-sheet header), .no-print { display: none !important; }
  main { padding: 0 !important; }
  .timetable-sheet table {
    font-size: clamp(4.5pt, calc(172mm / (var(--lanes) * 4.4)), 8.5pt);
    line-height: 1.15;
    table-layout: fixed;
  }
  .timetable-sheet th, .timetable-sheet td { padding: 0.5mm 0.8mm; font-size: inherit; }
  .timetable-sheet tr { break-inside: avoid; }
  .timetable-sheet tr[data-empty="true"] td, .timetable-sheet tr[data-empty="true"] th[scope="row"] { display: none; }
  .timetable-sheet article { border-width: 0 0 0 0.7mm; padding: 0 0 0 0.8mm; min-height: 0; }
  .timetable-sheet article * { font-size: inherit; line-height: 1.15; min-height: 0; }
  .timetable-sheet a { color: inherit; text-decoration: none; }
}
`;
