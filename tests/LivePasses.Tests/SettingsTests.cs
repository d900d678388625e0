namespace LivePasses.Tests;

public class SettingsTests
{
    [Theory]
    [InlineData(null, "5080", null, 1, 0.8, "--listen 5080")]
    [InlineData(null, "nowhere:5080", null, 1, 0.8, "--listen nowhere:5080")]
    [InlineData("broker", "127.0.0.1:5080", null, 1, 0.8, "--broker broker")]
    [InlineData("broker:0", "127.0.0.1:5080", null, 1, 0.8, "--broker broker:0")]
    [InlineData(null, "127.0.0.1:5080", "a/+/b", 1, 0.8, "--topic 'a/+/b'")]
    [InlineData(null, "127.0.0.1:5080", "", 1, 0.8, "--topic ''")]
    [InlineData(null, "127.0.0.1:5080", null, -1, 0.8, "--speed -1")]
    [InlineData(null, "127.0.0.1:5080", null, double.NaN, 0.8, "--speed NaN")]
    [InlineData(null, "127.0.0.1:5080", null, 1, 80, "--quality-limit 80")]
    public void Of_BadSetting_IsNamed(string? broker, string listen, string? topic, double speed, double limit, string named) =>
        Assert.Contains(named, Assert.Throws<SettingsException>(() => LiveSettings.Of(null, broker, listen, topic, speed, limit, "out")).Message, StringComparison.Ordinal);

    [Fact]
    public void Of_MissingFile_IsNamed() =>
        Assert.Contains("no-such.json", Assert.Throws<SettingsException>(() => LiveSettings.Of("no-such.json", "broker:1883", "127.0.0.1:5080", null, 1, 0.8, "out")).Message, StringComparison.Ordinal);

    [Fact]
    public void Of_SimulatedPlantUnderTheTagsOfAnother_IsRefused() =>
        Assert.Contains("--plant with --generator", Assert.Throws<SettingsException>(() => LiveSettings.Of("mine.json", "broker:1883", "127.0.0.1:5080", null, 1, 0.8, "out", plant: true)).Message, StringComparison.Ordinal);

    [Fact]
    public void Of_SamplingOutOfRange_IsRefused() =>
        Assert.Contains("--sampling 0", Assert.Throws<SettingsException>(() => LiveSettings.Of(null, null, "127.0.0.1:5080", null, 1, 0.8, "out", sampling: 0)).Message, StringComparison.Ordinal);

    [Theory]
    [InlineData("Marten 2", "marten-2")]
    [InlineData("  ", "generator")]
    [InlineData("A/B + #c", "a-b-c")]
    public void Plain_AnyName_IsALevelOfATopic(string name, string plain) => Assert.Equal(plain, Tags.Topics.Plain(name));
}
