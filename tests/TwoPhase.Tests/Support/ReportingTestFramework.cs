using System.Reflection;
using Xunit.Abstractions;
using Xunit.Sdk;

[assembly: TestFramework("TwoPhase.Tests.Support.ReportingTestFramework", "TwoPhase.Tests")]

namespace TwoPhase.Tests.Support;

/// <summary>The usual framework, which writes the validation report when the last test is done.</summary>
public sealed class ReportingTestFramework(IMessageSink diagnostics) : XunitTestFramework(diagnostics)
{
    protected override ITestFrameworkExecutor CreateExecutor(AssemblyName assemblyName) => new Executor(assemblyName, SourceInformationProvider, DiagnosticMessageSink);

    private sealed class Executor(AssemblyName assemblyName, ISourceInformationProvider sources, IMessageSink diagnostics) : XunitTestFrameworkExecutor(assemblyName, sources, diagnostics)
    {
        protected override void RunTestCases(IEnumerable<IXunitTestCase> testCases, IMessageSink executionMessageSink, ITestFrameworkExecutionOptions executionOptions) =>
            base.RunTestCases(testCases, new Watch(executionMessageSink), executionOptions);
    }

    private sealed class Watch(IMessageSink next) : LongLivedMarshalByRefObject, IMessageSink
    {
        public bool OnMessage(IMessageSinkMessage message)
        {
            if (message is ITestAssemblyFinished) ValidationReport.Write();
            return next.OnMessage(message);
        }
    }
}
