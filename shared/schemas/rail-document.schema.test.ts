import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { railDocumentSchema } from './rail-document.schema';

const written = JSON.stringify(z.toJSONSchema(railDocumentSchema, { io: 'input' }));

describe('the document as JSON Schema', () => {
  it.each([
    '[Hz, Re, Im] in ohm, frequencies rising; read',
    '[Hz, Re, Im] in ohm of the part alone',
    '[Hz, ohm], frequencies rising; instead of esr_ohm',
    '[V, C ÷ C(0 V)]',
    '[°C, C ÷ C(25 °C)]',
    '[start, end] in Hz',
    'added to esl_H, and to an impedance_table',
    'only where the plane has its geometry',
    'From the end of the rise to the start of the fall, in s',
    'Hours in use',
    '± per cent of voltage_V',
    'Level = voltage_V',
    'From pins to die',
    'Parts to choose from, by id',
  ])('says to whoever writes one by hand: %s', (words) => {
    expect(written).toContain(words);
  });
});
