import { spec } from '../support/spec';

spec('test/syntax/forms.md');
spec('test/syntax/recovery.md');
