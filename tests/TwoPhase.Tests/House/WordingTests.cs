using System.Reflection;

namespace TwoPhase.Tests.House;

/// <summary>Names that would hide a unit type or a namespace of ours.</summary>
public class WordingTests
{
    [Fact]
    public void Methods_NoPublicOne_IsNamedLikeAUnitTypeOrANamespace()
    {
        Assembly library = typeof(TwoPhase.Slip.VoidFractionModel).Assembly;
        var taken = typeof(UnitsNet.Pressure).Assembly.GetExportedTypes().Where(type => type.IsValueType && type.Namespace == "UnitsNet").Select(type => type.Name)
            .Concat(library.GetExportedTypes().Select(type => type.Namespace!.Split('.')[^1])).ToHashSet();
        string[] wrong = [.. library.GetExportedTypes().SelectMany(type => type.GetMethods(BindingFlags.Public | BindingFlags.Static | BindingFlags.Instance | BindingFlags.DeclaredOnly))
            .Where(method => !method.IsSpecialName && taken.Contains(method.Name)).Select(method => $"{method.DeclaringType!.Name}.{method.Name}")];
        Assert.True(wrong.Length == 0, string.Join(", ", wrong));
    }
}
