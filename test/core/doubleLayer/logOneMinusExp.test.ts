import { describe, expect, it } from 'vitest';
import { logOneMinusExp } from '../../../core/doubleLayer/logOneMinusExp';

describe('logOneMinusExp', () => {
  it('follows ln x at the near end and −e^(−x) at the far end, where the plain form has no digits left', () => {
    expect(logOneMinusExp(1e-20)).toBeCloseTo(Math.log(1e-20), 12);
    expect(logOneMinusExp(50) / -Math.exp(-50)).toBeCloseTo(1, 14);
  });

  it('is ln ½ where its branches meet', () => {
    expect(logOneMinusExp(Math.LN2)).toBeCloseTo(-Math.LN2, 15);
    expect(logOneMinusExp(Math.LN2 * (1 + 1e-15))).toBeCloseTo(-Math.LN2, 14);
  });
});
