using System.Text;
using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>Gets the code of loading ready, so that a program can do so on another thread while it reads its command line.</summary>
public static class WarmUp
{
    private const string Assembly = """
        boltup: assembly/1
        frequencies: { from: 20 Hz, to: 40 Hz, step: 1 Hz }
        parts: { a: { file: a, turned: { about: z, by: 90 deg }, moved: [1 m, 0 m, 0 m] } }
        mounts: { m: { stiffness: { x: 1 N/mm }, loss_factor: 0.1 } }
        joints: { j: { between: [a.b, ground], through: m } }
        operations: { o: { blocked_forces: { file: a, part: a } } }
        responses: { r: { at: a.b.x } }
        """;

    /// <summary>Runs a small document in memory through all steps but the file system. Safe to call on any thread.</summary>
    public static void Run()
    {
        var diagnostics = new DiagnosticBag();
        var file = new SourceFile(Path.GetFullPath("a.assembly.yaml"), "a.assembly.yaml");
        if (YamlReader.Read(Encoding.UTF8.GetBytes(Assembly), file, diagnostics) is YamlMap root)
        {
            new ShapeValidator(diagnostics).Validate(root, AssemblyShape.Root);
            new AssemblyReferences(new AssemblyBinder(diagnostics).Bind(root, []), diagnostics).Check();
        }
    }
}
