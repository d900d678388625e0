using System.Reflection;
using System.Xml.Linq;
using Microsoft.CodeAnalysis;

namespace TwoPhase.Tests.House;

/// <summary>Every published formula is in its index, is documented with its range and source, and has a reference point.</summary>
public class ModelTests
{
    private static readonly Type[] FamilyTypes = [.. typeof(TwoPhase.Slip.VoidFractionModel).Assembly.GetExportedTypes().Where(type => type.IsAbstract && type.GetProperty("All", BindingFlags.Public | BindingFlags.Static) is not null)];

    public static TheoryData<Type> Families => [.. FamilyTypes];

    [Theory, MemberData(nameof(Families))]
    public void All_HoldsEveryStaticModel_AndNothingElse(Type family)
    {
        PropertyInfo[] statics = Statics(family);
        var all = ((System.Collections.IEnumerable)family.GetProperty("All")!.GetValue(null)!).Cast<object>().ToList();
        Assert.Equal(all.Count, all.Distinct().Count());
        Assert.Equal(statics.Select(property => property.GetValue(null)!).ToHashSet(), all.ToHashSet());
    }

    [Theory, MemberData(nameof(Families))]
    public void Name_OfEveryModel_IsItsOwn(Type family)
    {
        string[] names = [.. Statics(family).Select(property => property.GetValue(null)!.ToString()!)];
        Assert.All(names, name => Assert.False(string.IsNullOrWhiteSpace(name)));
        Assert.Equal(names.Length, names.Distinct().Count());
    }

    [Fact]
    public void Documentation_OfEveryModel_HasRangeAccuracyAndSource()
    {
        string[] bare = [.. FamilyTypes.SelectMany(family => Statics(family).Where(property => !Documented(family, property.Name)).Select(property => $"{family.Name}.{property.Name}"))];
        Assert.True(bare.Length == 0, "No Range:, Accuracy: or Source: in the documentation of " + string.Join(", ", bare));
    }

    private static bool Documented(Type family, string property)
    {
        ISymbol symbol = Compiler.Library.GetTypeByMetadataName(family.FullName!)!.GetMembers(property).Single();
        string text = XElement.Parse(symbol.GetDocumentationCommentXml()!).Value;
        return new[] { "Range:", "Accuracy:", "Source:" }.All(word => text.Contains(word, StringComparison.Ordinal));
    }

    private static PropertyInfo[] Statics(Type family) => [.. family.GetProperties(BindingFlags.Public | BindingFlags.Static | BindingFlags.DeclaredOnly).Where(property => property.PropertyType == family && property.Name != "Default")];
}
