/** Finding a state vector in a mail: fetched after the start, since the first page stands without it. */
import { readStateText } from '../../core/index';

export const readState = readStateText;
