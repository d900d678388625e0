using System.Reflection;
using System.Runtime.Loader;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;

namespace TwoPhase.Tests.House;

/// <summary>Compiles C# in memory: the library's sources to inspect them, a snippet of the docs to run it.</summary>
internal static class Compiler
{
    private const string ImplicitUsings = """
        global using System; global using System.Collections.Generic; global using System.IO;
        global using System.Linq; global using System.Threading; global using System.Threading.Tasks;
        """;

    private static readonly Lazy<CSharpCompilation> LibraryCompilation = new(() => Compile("Library", OutputKind.DynamicallyLinkedLibrary, References("TwoPhase.dll"), [.. Repository.LibrarySources().Select(path => CSharpSyntaxTree.ParseText(File.ReadAllText(path), Options, path))]));

    private static readonly CSharpParseOptions Options = new(LanguageVersion.Preview, DocumentationMode.Diagnose, preprocessorSymbols: ["NET", "NET10_0", "NET10_0_OR_GREATER", "NET8_0_OR_GREATER"]);

    private static readonly Lock ConsoleLock = new();

    /// <summary>The library as the net10.0 target sees it.</summary>
    public static CSharpCompilation Library => LibraryCompilation.Value;

    /// <summary>Compiles top-level statements against the built library, runs them and returns what they print.</summary>
    public static string Run(string program)
    {
        CSharpCompilation compilation = Compile("Snippet", OutputKind.ConsoleApplication, References(), [CSharpSyntaxTree.ParseText(program, Options)]);
        using var image = new MemoryStream();
        var result = compilation.Emit(image);
        Assert.True(result.Success, string.Join(Environment.NewLine, result.Diagnostics.Where(d => d.Severity == DiagnosticSeverity.Error)));
        image.Position = 0;
        MethodInfo main = AssemblyLoadContext.Default.LoadFromStream(image).EntryPoint!;
        lock (ConsoleLock)
        {
            TextWriter before = Console.Out;
            using var output = new StringWriter();
            Console.SetOut(output);
            try
            {
                main.Invoke(null, main.GetParameters().Length == 0 ? null : [Array.Empty<string>()]);
            }
            finally
            {
                Console.SetOut(before);
            }

            return output.ToString().ReplaceLineEndings("\n").TrimEnd();
        }
    }

    private static CSharpCompilation Compile(string name, OutputKind kind, IEnumerable<MetadataReference> references, IEnumerable<SyntaxTree> trees) => CSharpCompilation.Create(
        name + Guid.NewGuid().ToString("N"),
        trees.Append(CSharpSyntaxTree.ParseText(ImplicitUsings, Options)),
        references,
        new CSharpCompilationOptions(kind, nullableContextOptions: NullableContextOptions.Enable, allowUnsafe: true));

    private static IEnumerable<MetadataReference> References(string? except = null) => ((string)AppContext.GetData("TRUSTED_PLATFORM_ASSEMBLIES")!)
        .Split(Path.PathSeparator)
        .Where(path => Path.GetFileName(path) != except)
        .Select(path => MetadataReference.CreateFromFile(path));
}
