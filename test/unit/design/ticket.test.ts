import { describe, expect, it } from 'vitest';
import { ticketMarkdown, ticketText } from '../../../src/design/ticket.ts';
import { plainBuilt, plainDossier, withOption } from './plain-dossier.ts';

describe('ticketText(dossier)', () => {
  it('tells what, verdict, figures, digest and file in aligned lines', () => {
    expect(ticketText(plainDossier)).toBe(
      [
        'Transmitter to whip',
        'EX-014, revision A, 2026-01-31, draft',
        '',
        'Verdict               meets the requirement: return loss 17.25 dB at worst',
        'Design frequency      151.25 MHz',
        'Band                  150.5 MHz to 152 MHz',
        'Return loss required  at least 14 dB',
        'Return loss at worst  17.25 dB with exact parts',
        'Network               Series L, shunt C',
        'Parts                 L1 84.63 nH, C1 43.71 pF',
        'Loss                  0.21 dB for the stated Q',
        `Record’s SHA-256      ${'0123456789abcdef'.repeat(4)}`,
        'Report                EX-014_A.pdf',
        'Computed with         Ferrule 1.2.3',
        '',
      ].join('\n'),
    );
  });

  it('tells real parts with their yield, loss and stress', () => {
    const text = ticketText(withOption({ built: plainBuilt }));
    expect(text).toContain('Return loss at worst  15.50 dB; with exact, ideal parts 17.25 dB\n');
    expect(text).toContain('Parts                 L1 82 nH (E24)\n');
    expect(text).toContain('Yield                 93.2 % (91.4 to 94.7 %, 95 % confidence, 1000 networks, seed 1)\n');
    expect(text).toContain('Loss                  0.31 dB\n');
    expect(text).toContain('Stress                every part is within its derated rating at 2 W\n');
  });

  it('tells a shortfall, its deviation, the ticket and what the revision changes', () => {
    const { record } = plainDossier;
    const short = withOption({ meets: false, reasons: ['DC passes', 'return loss too low'] });
    const text = ticketText({
      ...short,
      record: {
        ...record,
        identity: { ...record.identity, ticket: 'CR-7', change: 'wider band', revision: 'B' },
        deviations: [{ subject: 'DC block', reason: 'accepted for the pilot run' }],
        signOff: { ...record.signOff, state: 'issued' },
      },
    });
    expect(text).toContain('EX-014, revision B, 2026-01-31, issued, ticket CR-7\n');
    expect(text).toContain('falls short of the requirement: DC passes; return loss too low\n');
    expect(text).toContain('What changes          wider band\n');
    expect(text).toContain('Deviation, DC block   accepted for the pilot run\n');
  });

  it('tells that there is no network, and that verification fails', () => {
    expect(ticketText({ ...plainDossier, options: [], chosen: null })).toContain(
      'Verdict               no network of the kind asked for matches these terminations\n',
    );
    const failing = { ...plainDossier, evidence: { ...plainDossier.evidence!, pass: false } };
    expect(ticketText(failing)).toContain('at worst; verification fails\n');
  });

  it('keeps lines below 100 letters, whatever the title', () => {
    const { record } = plainDossier;
    const identity = { ...record.identity, title: '図'.repeat(120), change: 'x'.repeat(4000) };
    const lines = ticketText({ ...plainDossier, record: { ...record, identity } }).split('\n');
    expect(Math.max(...lines.map((line) => Array.from(line).length))).toBeLessThan(100);
  });
});

describe('ticketMarkdown(dossier)', () => {
  it('tells the same as a table', () => {
    const text = ticketMarkdown(plainDossier);
    expect(text).toMatch(
      /^\*\*Transmitter to whip\*\*\n\nEX-014, revision A, 2026-01-31, draft\n\n\| Subject \| Figure \|\n/,
    );
    expect(text).toContain('| Network | Series L, shunt C |\n');
    expect(text).toContain('| Report | EX-014\\_A.pdf |\n');
    // Title, document, head of the table and a line for each of the eleven facts, with the empty ones between.
    expect(text.split('\n').length).toBe(4 + 2 + 11 + 1);
  });
});
