// A mutant is caught by an assertion only: swc checks no types, and a syntax error, a crash or a
// time-out would show nothing about the tests.
const ESCAPES = /\u001b\[\d*m/g;
const MATCHER = /^(Error|JestAssertionError): expect\(/;
const PROPERTY_IS_FALSE = /^Error: Property failed after [^]*Property failed by returning false/;
// fast-check gives an expectation inside a property as the cause, which only the suite's text has
const PROPERTY_EXPECTS = /Property failed after (?:(?!●)[^])*Cause:\s+expect\(/;

const plain = (text) => text.replace(ESCAPES, '');

/** Whether a failed test's message comes from an expectation, or a property that does not hold. */
function isAssertion(message) {
  return MATCHER.test(plain(message)) || PROPERTY_IS_FALSE.test(plain(message));
}

/**
 * Reads jest's JSON report.
 *
 * @returns `caught` with what asserts, `passed`, or `crashed` with a first line
 */
export function readVerdict({ success, testResults }) {
  const tests = testResults.flatMap(({ assertionResults }) => assertionResults);
  const test = tests.find(({ failureMessages }) => failureMessages.some(isAssertion));
  if (test) return { state: 'caught', by: test.fullName };
  const suite = testResults.find(({ message }) => PROPERTY_EXPECTS.test(plain(message)));
  if (suite) return { state: 'caught', by: `a property: ${firstFailure(suite)}` };
  if (success) return { state: 'passed', by: '' };
  const messages = [
    ...tests.flatMap(({ failureMessages }) => failureMessages),
    ...testResults.map(({ message }) => message),
  ];
  const [first = 'no tests ran'] = messages.filter(Boolean);
  return { state: 'crashed', by: plain(first).trim().split('\n')[0] };
}

function firstFailure({ assertionResults }) {
  const failed = assertionResults.find(({ status }) => status === 'failed');
  return failed?.fullName ?? 'the whole suite';
}
