import { handledKg, isAboveHandlingReference, stackLoad } from '@/shared/domain/stack-load';

describe('the load of a stack', () => {
  it('is tare and payload, times the stack, and times what stands above the lowest', () => {
    expect(stackLoad({ tareKg: '2.1', payloadKg: '25', stackLimit: 8 })).toEqual({
      grossKg: '27.1',
      stackKg: '216.8',
      onLowestKg: '189.7',
    });
  });

  it('puts nothing on a container that may not be stacked', () => {
    expect(stackLoad({ tareKg: '96', payloadKg: '640', stackLimit: 1 }).onLowestKg).toBe('0');
  });

  it('adds decimals exactly: 0.1 + 0.2 kg', () => {
    expect(stackLoad({ tareKg: '0.1', payloadKg: '0.2', stackLimit: 3 }).stackKg).toBe('0.9');
  });
});

describe('what is lifted by hand', () => {
  it('is a tote with its payload, but of a pallet, box or rack the empty one', () => {
    const type = { tareKg: '15.5', payloadKg: '1000' };
    expect(handledKg({ ...type, kind: 'tote' })).toBe('1015.5');
    expect(handledKg({ ...type, kind: 'pallet' })).toBe('15.5');
  });

  it('asks for a caution above 25 kg, not at it', () => {
    expect([isAboveHandlingReference('25'), isAboveHandlingReference('25.0')]).toEqual([false, false]);
    expect(isAboveHandlingReference('25.001')).toBe(true);
  });
});
