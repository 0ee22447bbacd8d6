import { describe, expect, it } from 'vitest';
import { headerFault } from './points-header';
import { readPoints } from './points-text';

const table = ['Hz', 'Ω', 'Ω'] as const;
const bare = ['1', '0.01', '-2.5e-3'];

describe('the header of a table over frequency', () => {
  it.each([
    ['freq_kHz,Re,Im', 'says kHz: give frequencies in Hz'],
    ['# f [MHz]; Re; Im', 'says MHz: give frequencies in Hz, or write the unit with each number'],
    ['"Frequency (GHz)","R","X"', 'says GHz'],
    ['f/KHZ Re Im', 'says KHZ'],
    ['omega (rad/s), Re, Im', 'says rad/s'],
    ['f (Hz),Re (mΩ),Im (mΩ)', 'says mΩ: give impedances in ohm'],
    ['f (Hz),Re (mOhm),Im (mOhm)', 'says mOhm'],
    ['Hz, kohm, kohm', 'says kohm'],
    ['f in Hz, Z in milliohm', 'says milliohm'],
    ['f (Hz),|Z| (Ohm),theta', 'says |Z|: give Re Z and Im Z in ohm, not magnitude and phase'],
    ['f,Mag,Phase', 'says Mag'],
    ['f (Hz);Z (ohm);phase (deg)', 'says phase'],
    ['f (Hz), Z (ohm), °', 'says °'],
    ['freq(Hz), Z(dBohm), x', 'says dBohm: give impedances in ohm'],
    ['f gain_dB x', 'says dB'],
    ['# MHZ S RI R 50', 'begins network parameters'],
    ['# S MA R 50', 'begins network parameters'],
    ['# Hz Z RI R 1', 'begins network parameters'],
  ])('%s is refused', (line, reason) => {
    expect(headerFault(line, table, bare)).toContain(reason);
  });

  it.each([
    'f (Hz),Re,Im',
    'Frequency [Hz]; Re Z [Ohm]; Im Z [Ohm]',
    '# Hz Ω Ω',
    '# swept from 10 kHz to 30 MHz at 25 °C, phase 1 of the buck',
    '# measured with 50 ohm, −20 dBm',
    'Z of the buck, photograph 3, image 2',
    'Hz, Im ohm, Re ohm',
  ])('%s passes', (line) => {
    expect(headerFault(line, table, bare)).toBeNull();
  });

  it('misleads nobody where each number says its own unit', () => {
    expect(headerFault('f (MHz),Re,Im', table, ['1 MHz', '1', '2'])).toBeNull();
    expect(headerFault('f (kHz),Re (mΩ),Im', table, ['1k', '3m', '2m'])).toBeNull();
    expect(headerFault('f (Hz),Re (mΩ),Im', table, ['1000', '3', '2'])).not.toBeNull();
  });

  it('is not asked about magnitudes where only a magnitude is wanted, nor about volts', () => {
    expect(headerFault('f (Hz),|Z| (Ohm)', ['Hz', 'Ω'], bare)).toBeNull();
    expect(headerFault('f (MHz),ESR', ['Hz', 'Ω'], bare)).toContain('MHz');
    expect(headerFault('U (V),C (dB)', ['V', ''], bare)).toBeNull();
  });

  it('stops the points, with its line', () => {
    expect(readPoints('# by hand\n# f (MHz) Re Im\n1 0.1 0.2', table)).toEqual({
      ok: false,
      reason:
        'line 2: the header “f (MHz) Re Im” says MHz: give frequencies in Hz, or write the unit with each number',
      line: 2,
    });
    // Nine columns of network parameters: said by the header, not by the number of columns.
    expect(readPoints('# MHZ S RI R 50\n1 0 0 1 1 1 1 0 0', table)).toMatchObject({
      reason: expect.stringContaining('network parameters'),
    });
    expect(readPoints('# f (MHz) Re Im\n1M 0.1 0.2', table)).toMatchObject({ ok: true });
  });
});
