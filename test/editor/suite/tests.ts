// The tests of both suites, in the order in which they run.
import './record.test';
