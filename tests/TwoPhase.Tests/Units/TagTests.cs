using TwoPhase.Units;

namespace TwoPhase.Tests.Units;

public class TagTests
{
    [Theory]
    [InlineData("FT-101 [m3/d at 15 degC]", "FT-101", "m3/d at 15 degC")]
    [InlineData("feed_flow_kg_s", "feed_flow_kg_s", "")]
    [InlineData("A[1].PV [%]", "A[1].PV", "%")]
    public void Parse_NameAndUnit_ArePartedAtTheBracket(string text, string name, string unit)
    {
        var tag = Tag.Parse(text);
        Assert.Equal((name, unit), (tag.Name, tag.Unit));
        Assert.Equal(tag, Tag.Parse(tag.ToString()));
    }

    [Theory]
    [InlineData("")]
    [InlineData(" [kPa]")]
    public void Parse_NoName_Throws(string text) => Assert.Throws<FormatException>(() => Tag.Parse(text));

    [Fact]
    public void Map_BasisMissing_NamesTheTag()
    {
        FormatException error = Assert.Throws<FormatException>(() => Tag.Parse("PT-103 [kPa]").Map(UnitKind.AbsolutePressure, UnitBasis.None));
        Assert.StartsWith("Tag 'PT-103'", error.Message, StringComparison.Ordinal);
    }
}
