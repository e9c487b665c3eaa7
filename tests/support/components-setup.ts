import '@testing-library/jest-dom';
import { configure } from '@testing-library/dom';

// On a loaded machine, too, what is waited for may take its time.
configure({ asyncUtilTimeout: 15_000 });
