#!/usr/bin/env python3
"""The public tests of Jupyter kernels, jupyter_kernel_test, for both kernels.

Runs in the environment of whorl lab, with requirements.txt. What has no sample is left out: the
pager, which the protocol has given up.
"""

import argparse
import pathlib
import sys
import unittest

from jupyter_kernel_test import IopubWelcomeTests, KernelTests

JAVA = "%%java\n"


class SheetTests(KernelTests):
    kernel_name = "whorl"
    language_name = "whorl"
    file_extension = ".whorl"
    code_hello_world = JAVA + 'System.out.println("hello, world");'
    code_stderr = JAVA + 'System.err.println("oops");'
    completion_samples = [
        {"text": "x = 3 + sq", "matches": ["sqrt"]},
        {"text": "x = \\alph", "matches": ["α"]},
    ]
    complete_code_samples = ["m [kg] = 412", "check 1 <= 2", "a = (1 + 2)*3", "# a remark"]
    incomplete_code_samples = ["a = (1 + 2", "a = 1 +"]
    invalid_code_samples = ["a = )", "a = = 2"]
    code_generate_error = "t [s] = 3 kg"
    code_execute_result = [
        {"code": JAVA + "6 * 7", "result": "42"},
        {"code": JAVA + '"a" + 1', "result": "a1"},
        {"code": JAVA + "6 * 9"},
    ]
    code_display_data = [
        {"code": "m [kg] = 412", "mime": "text/html"},
        {"code": "F [N] = 412 kg * g_n", "mime": "text/plain"},
    ]
    code_history_pattern = JAVA + "6 ? 7"
    supported_history_operations = ("tail", "range", "search")
    code_inspect_sample = "sqrt"
    code_clear_output = JAVA + 'display("gone"); clearOutput(true);'


class JavaTests(KernelTests):
    kernel_name = "whorl-java"
    language_name = "Java"
    file_extension = ".java"
    code_hello_world = 'System.out.println("hello, world");'
    code_stderr = 'System.err.println("oops");'
    completion_samples = [
        {"text": "Math.sqr", "matches": ["sqrt("]},
        {"text": "java.util.function.ToDoubleBiF", "matches": ["ToDoubleBiFunction"]},
    ]
    complete_code_samples = ["int x = 1;", "1 + 1", "int f() { return 1; }"]
    incomplete_code_samples = ["int f() {", "int x = (1 +", "if (true)"]
    invalid_code_samples = ["int x = );", "}"]
    code_generate_error = "int x = ;"
    code_execute_result = [
        {"code": "6 * 7", "result": "42"},
        {"code": '"a" + 1', "result": "a1"},
        {"code": "6 * 9"},
    ]
    code_display_data = [{"code": 'display("<b>x</b>", "text/html")', "mime": "text/html"}]
    code_history_pattern = "6 ? 7"
    supported_history_operations = ("tail", "range", "search")
    code_inspect_sample = "Math.sqrt"
    code_clear_output = 'display("gone"); clearOutput(true);'


class SheetWelcomeTests(IopubWelcomeTests):
    kernel_name = "whorl"
    support_iopub_welcome = True


class JavaWelcomeTests(IopubWelcomeTests):
    kernel_name = "whorl-java"
    support_iopub_welcome = True


def main():
    parser = argparse.ArgumentParser(description=__doc__)
    parser.add_argument("--count-to", type=pathlib.Path, help="write '<passed> <failed>' here")
    arguments = parser.parse_args()
    loader = unittest.TestLoader()
    suite = unittest.TestSuite(
        loader.loadTestsFromTestCase(case)
        for case in (SheetTests, JavaTests, SheetWelcomeTests, JavaWelcomeTests)
    )
    result = unittest.TextTestRunner(verbosity=2).run(suite)
    failed = len({test.id().split(" ")[0] for test, _ in result.failures + result.errors})
    passed = result.testsRun - failed - len(result.skipped)
    print(f"{passed} passed, {failed} failed")
    if arguments.count_to:
        arguments.count_to.write_text(f"{passed} {failed}\n")
    return 0 if result.wasSuccessful() else 1


if __name__ == "__main__":
    sys.exit(main())
