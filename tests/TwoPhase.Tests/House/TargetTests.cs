using System.Reflection;
using System.Runtime.Versioning;

namespace TwoPhase.Tests.House;

public class TargetTests
{
    // The netstandard2.0 run of these tests proves nothing if it loads the net10.0 library.
    [Fact]
    public void Library_UnderTest_IsTheTargetThatWasAskedFor()
    {
        string wanted = typeof(TargetTests).Assembly.GetCustomAttributes<AssemblyMetadataAttribute>().Single(item => item.Key == "LibraryTarget").Value!;
        string framework = typeof(TwoPhase.Slip.VoidFractionModel).Assembly.GetCustomAttribute<TargetFrameworkAttribute>()!.FrameworkName;
        Assert.StartsWith(wanted == "netstandard2.0" ? ".NETStandard,Version=v2.0" : ".NETCoreApp,Version=v10.0", framework, StringComparison.Ordinal);
    }
}
