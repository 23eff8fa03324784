"""The public conformance suite of the messaging protocol: every test enabled, none skipped."""
import unittest

import jupyter_client
import jupyter_kernel_test
import zmq


def suite_case(kernel):
    """The suite with cells of ours for every test that it has."""
    return type("Conformance", (jupyter_kernel_test.KernelTests,), {
        "kernel_name": kernel,
        "language_name": "java",
        "file_extension": ".java",
        "code_hello_world": 'System.out.println("hello, world");',
        "code_stderr": 'System.err.println("on the other stream");',
        "completion_samples": [{"text": "System.ou"}, {"text": "V(1.8).pl"}, {"text": "Technology.rea"},
                               {"text": "um(2).negat", "matches": ["negate()"]}],
        "complete_code_samples": ["V(1.8)", "var x = mV(650);", "int twice(int x) {\n    return 2 * x;\n}"],
        "incomplete_code_samples": ["int twice(int x) {", "um(2).plus(", "/* a remark", 'var s = """'],
        "invalid_code_samples": ["int = ;", "}"],
        "code_page_something": 'help("V")',
        "code_generate_error": 'throw new IllegalStateException("the bias ran away");',
        "code_execute_result": [{"code": "6 * 7", "result": "42"}, {"code": "1 + 2 + 3", "result": "6"},
                                {"code": "um(2)", "mime": "text/html"}],
        "code_display_data": [{"code": "show(um(2))", "mime": "text/plain"}, {"code": "show(um(2))", "mime": "text/html"}],
        "code_history_pattern": "1 ? 2*",
        "supported_history_operations": ("tail", "range", "search"),
        "code_inspect_sample": "Math.max",
        "code_clear_output": "clearOutput()",
    })


def welcome_case(kernel):
    """A subscriber that asks nothing must be welcomed (protocol 5.5; newer than the suite)."""

    class Welcome(unittest.TestCase):
        def test_welcome(self):
            manager = jupyter_client.KernelManager(kernel_name=kernel)
            manager.start_kernel()
            with zmq.Context() as context, context.socket(zmq.SUB) as subscriber:
                try:
                    subscriber.linger = 0
                    subscriber.subscribe(b"")
                    subscriber.connect(f"tcp://{manager.ip}:{manager.iopub_port}")
                    self.assertTrue(subscriber.poll(30000), "no message within 30 s")
                    _, frames = manager.session.feed_identities(subscriber.recv_multipart())
                    message = manager.session.deserialize(frames)
                    self.assertEqual(message["msg_type"], "iopub_welcome")
                    self.assertEqual(message["content"], {"subscription": ""})
                finally:
                    manager.shutdown_kernel(now=True)

    return Welcome


def problems(setup):
    loader = unittest.TestLoader()
    tests = unittest.TestSuite(loader.loadTestsFromTestCase(c) for c in (suite_case(setup.kernel), welcome_case(setup.kernel)))
    count = tests.countTestCases()
    result = unittest.TestResult()
    tests.run(result)
    print(f"  suite {jupyter_kernel_test.__version__}: {count} tests, {len(result.failures) + len(result.errors)} failed, "
          f"{len(result.skipped)} skipped")
    found = [f"{test}: {trace}" for test, trace in result.failures + result.errors]
    found += [f"{test}: skipped" for test, _ in result.skipped]
    return found if count > 10 else found + [f"only {count} tests were found"]
