import { plainDecimal } from '@/shared/domain/plain-decimal';

describe('a decimal without padding', () => {
  it.each([
    ['4.5000', '4.5'],
    ['20.000', '20'],
    ['200', '200'],
    ['0.000000', '0'],
    ['0.030000', '0.03'],
  ])('%s is %s', (padded, plain) => expect(plainDecimal(padded)).toBe(plain));

  it('refuses what is not a decimal', () => {
    expect(() => plainDecimal('4,5')).toThrow('Not a plain decimal');
  });
});
