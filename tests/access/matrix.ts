import { ACTION_ROWS } from './actions';
import { HANDLER_ROWS } from './handlers';
import { PAGE_ROWS } from './pages';
import type { Row } from './row';

/** Every page, handler and action with who gets what. A page, handler or action without a row fails the architecture test. */
export const MATRIX: readonly Row[] = [...PAGE_ROWS, ...HANDLER_ROWS, ...ACTION_ROWS];
