// A mutant is caught by an assertion only: swc checks no types, and a syntax error, a crash or a
// time-out would show nothing about the tests.
const ESCAPES = /\u001b\[\d*m/g;
const MATCHER = /^(Error|JestAssertionError): expect\(/;
const PROPERTY = /^Error: Property failed after \d+ tests/;
const PROPERTY_VERDICT =
  /Property failed by returning false|(Got|cause\]?:) *(Error|JestAssertionError): expect\(/;

/** Whether one failure message comes from an expectation, alone or inside a property. */
export function isAssertion(message) {
  const plain = message.replace(ESCAPES, '');
  return MATCHER.test(plain) || (PROPERTY.test(plain) && PROPERTY_VERDICT.test(plain));
}

/**
 * Reads jest's JSON report.
 *
 * @returns `caught` with the first test that asserts, `passed`, or `crashed` with a first line
 */
export function readVerdict(report) {
  const tests = report.testResults.flatMap(({ assertionResults }) => assertionResults);
  const caughtBy = tests.find(({ failureMessages }) => failureMessages.some(isAssertion));
  if (caughtBy) return { state: 'caught', by: caughtBy.fullName };
  if (report.success) return { state: 'passed', by: '' };
  const messages = [
    ...tests.flatMap(({ failureMessages }) => failureMessages),
    ...report.testResults.map(({ message }) => message),
  ];
  const [first = 'no tests ran'] = messages.filter(Boolean);
  return { state: 'crashed', by: first.replace(ESCAPES, '').trim().split('\n')[0] };
}
