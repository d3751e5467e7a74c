/** How a proof looks on A4: two inks and words; nothing is said by colour alone. */
export const proofStyle = `
@page { size: A4; margin: 16mm 14mm; }
:root { --ink: #1a1a1a; --computed: #004c7a; --printed: #a85800; --second: #5f6368; --paper: #fff; }
@media screen and (prefers-color-scheme: dark) {
  :root { --ink: #f2f2f2; --computed: #8cc8f0; --printed: #c87a22; --second: #a7adb3; --paper: #14171a; }
}
body { margin: 0 auto; max-width: 182mm; padding: 4mm; color: var(--ink); background: var(--paper);
  font: 9pt/1.4 "Liberation Sans", Arial, sans-serif; }
@media print { body { padding: 0; } }
h1 { font-size: 15pt; margin: 4mm 0 2mm; }
h2 { font-size: 11pt; margin: 5mm 0 1.5mm; break-after: avoid; }
p, ol { margin: 1.5mm 0; max-width: 160mm; overflow-wrap: anywhere; }
.notice { border: 0.35mm solid var(--ink); padding: 2mm 3mm; }
dl div { display: flex; gap: 3mm; border-bottom: 0.35mm solid var(--second); padding: 0.8mm 0; }
dt { flex: 0 0 48mm; color: var(--second); }
dd { margin: 0; overflow-wrap: anywhere; }
table { border-collapse: collapse; width: 100%; font-variant-numeric: tabular-nums; }
thead { display: table-header-group; }
tr { break-inside: avoid; }
th, td { border-bottom: 0.35mm solid var(--second); padding: 0.8mm 1.5mm; text-align: right; font-size: 8pt; }
th { font-weight: 700; vertical-align: bottom; border-bottom: 0.7mm solid var(--ink); overflow-wrap: anywhere; }
.printed { color: var(--printed); border-left: 0.7mm solid var(--ink); }
.read, .physics, .ratio { color: var(--computed); }
td.differs { color: var(--ink); font-weight: 700; border-left: 1.4mm double var(--ink); }
.signature th { width: 60mm; text-align: left; border-bottom: 0.35mm solid var(--second); }
.signature td { height: 10mm; border-bottom: 0.7mm solid var(--ink); }
.signature tr { break-inside: avoid; }
`;
