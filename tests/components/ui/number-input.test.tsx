import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { MoneyInput } from '@/components/ui/MoneyInput';
import { NumberInput, type TypedNumber } from '@/components/ui/NumberInput';
import { readDecimal, readWhole } from '@/components/ui/read-number';

test.each([
  ['392', 392],
  [' 1 284 ', 1284],
  ['1\u202f284', 1284],
  ['1\u00a0284', 1284],
  ['1,284', 1284],
  ['-8', -8],
  ['\u22128', -8],
  ['', null],
  ['12.5', '12.5'],
  ['many', 'many'],
  ['1,28', '1,28'],
])('%j as a whole number reads %j', (typed, read) => {
  expect(readWhole(typed)).toBe(read);
});

test.each([
  ['4.50', '4.50'],
  ['4,50', '4.50'],
  ['1 284,5', '1284.5'],
  ['1.284,50', '1284.50'],
  ['1,284.50', '1284.50'],
  ['.5', '0.5'],
  ['007', '7'],
  ['four', 'four'],
  ['1.2.3', '1.2.3'],
])('%j as an amount reads %j', (typed, read) => {
  expect(readDecimal(typed)).toBe(read);
});

function Count({ onValue }: { onValue: (value: TypedNumber) => void }) {
  const [value, setValue] = useState<TypedNumber>(400);
  const change = (next: TypedNumber) => {
    setValue(next);
    onValue(next);
  };
  return <NumberInput label="Counted" value={value} onChange={change} steps />;
}

test('a number pasted with a blank is understood and shown as it was pasted', async () => {
  const onValue = jest.fn();
  render(<Count onValue={onValue} />);
  await userEvent.click(screen.getByLabelText('Counted'));
  await userEvent.paste('1 234');
  expect(onValue).toHaveBeenLastCalledWith(1234);
  expect(screen.getByLabelText('Counted')).toHaveValue('1 234');
});

test('what is not a number stays in the field and says so', async () => {
  render(<Count onValue={jest.fn()} />);
  await userEvent.click(screen.getByLabelText('Counted'));
  await userEvent.paste('about 400');
  await userEvent.tab();
  expect(screen.getByLabelText('Counted')).toHaveValue('about 400');
  expect(screen.getByLabelText('Counted')).toHaveAccessibleDescription('Write a whole number, like 392.');
});

test('one fewer and one more step the count', async () => {
  const onValue = jest.fn();
  render(<Count onValue={onValue} />);
  await userEvent.click(screen.getByRole('button', { name: 'One fewer: Counted' }));
  expect(onValue).toHaveBeenLastCalledWith(399);
});

test('an amount typed with a comma becomes a decimal string', async () => {
  const onValue = jest.fn();
  render(<MoneyInput label="Deposit" currency="EUR" value="" onChange={onValue} />);
  await userEvent.click(screen.getByLabelText('Deposit (EUR)'));
  await userEvent.paste('4,50');
  expect(onValue).toHaveBeenLastCalledWith('4.50');
});
