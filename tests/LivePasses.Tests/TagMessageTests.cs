using System.Buffers;
using System.Text;
using LivePasses.Tags;

namespace LivePasses.Tests;

public class TagMessageTests
{
    private static readonly DateTimeOffset Noon = new(2031, 3, 9, 12, 0, 0, TimeSpan.Zero);

    [Theory]
    [InlineData("""{"value":17.35,"unit":"t/h","time":"2031-03-09T12:00:00Z","status":"good"}""", 17.35)]
    [InlineData("""{"status":"bad","value":17.35}""", double.NaN)]
    [InlineData("""{"value":null}""", double.NaN)]
    [InlineData("""{"other":[{"value":1}],"value":-3}""", -3)]
    [InlineData("17.35", 17.35)]
    [InlineData("-1e3", -1000)]
    public void TryRead_Value_IsRead(string payload, double value)
    {
        Assert.True(TagMessage.TryRead(Bytes(payload), out TagMessage message, out string fault), fault);
        Assert.Equal(value, message.Value);
    }

    [Theory]
    [InlineData("")]
    [InlineData("NaN")]
    [InlineData("Infinity")]
    [InlineData("17,35")]
    [InlineData("[1]")]
    [InlineData("{")]
    [InlineData("""{"value":"17"}""")]
    [InlineData("""{"value":{"value":1}}""")]
    [InlineData("""{"unit":"t/h"}""")]
    [InlineData("""{"value":1,"time":"0001-01-01T00:00:00Z"}""")]
    [InlineData("""{"value":1,"time":"yesterday"}""")]
    [InlineData("""{"value":1,"time":7}""")]
    [InlineData("""{"value":1,"time":"2031-03-09T12:00:00"}""")]
    [InlineData("<script>alert(1)</script>")]
    public void TryRead_AnythingElse_IsRefusedWithAReason(string payload)
    {
        Assert.False(TagMessage.TryRead(Bytes(payload), out _, out string fault));
        Assert.NotEmpty(fault);
    }

    [Fact]
    public void TryRead_HugePayload_IsRefusedUnread() =>
        Assert.False(TagMessage.TryRead(Bytes("{\"value\":1,\"x\":\"" + new string('x', TagMessage.LongestPayload) + "\"}"), out _, out _));

    [Fact]
    public void TryRead_RandomBytes_NeverThrows()
    {
        var random = new Random(1);
        byte[] good = TagMessage.Payload(17.35, "t/h", Noon);
        for (int i = 0; i < 200_000; i++)
        {
            byte[] bytes = i % 2 == 0 ? new byte[random.Next(40)] : (byte[])good.Clone();
            if (i % 2 == 0) random.NextBytes(bytes);
            else bytes[random.Next(bytes.Length)] = (byte)random.Next(256);
            if (TagMessage.TryRead(new ReadOnlySequence<byte>(bytes), out TagMessage message, out _)) Assert.False(double.IsInfinity(message.Value));
        }
    }

    [Theory]
    [InlineData(17.35, "t/h")]
    [InlineData(double.NaN, "% of 75 kPa")]
    [InlineData(-1e-9, "\"quoted\" \\ <b>")]
    public void Payload_IsReadAgainAsItWasWritten(double value, string unit)
    {
        Assert.True(TagMessage.TryRead(new ReadOnlySequence<byte>(TagMessage.Payload(value, unit, Noon)), out TagMessage message, out string fault), fault);
        Assert.Equal(new TagMessage(value, Noon, unit), message);
    }

    private static ReadOnlySequence<byte> Bytes(string text) => new(Encoding.UTF8.GetBytes(text));
}
