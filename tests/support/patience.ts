// A loaded machine is slow, not wrong: no test is judged by its time.
jest.setTimeout(120_000);
