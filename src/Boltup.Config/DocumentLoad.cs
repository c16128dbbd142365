using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Config.Overlays;
using Boltup.Config.Paths;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>One load of a document with everything that it names.</summary>
internal sealed class DocumentLoad
{
    private readonly string _topPath;
    private readonly PathGuard _guard;
    private readonly DocumentReader _reader;
    private readonly OverlayReader _overlays;

    public DocumentLoad(string path, LoadOptions options)
    {
        _topPath = Path.GetFullPath(path, options.WorkingDirectory);
        _guard = new PathGuard(_topPath, options);
        _reader = new DocumentReader(_guard, options);
        _overlays = new OverlayReader(_reader, options);
    }

    public IReadOnlyList<SourceFile> FilesRead => _reader.FilesRead;

    public DocumentKind? Kind(DiagnosticBag diagnostics) =>
        _reader.Read(_topPath, named: null, diagnostics) is YamlMap root ? DocumentHeader.KindOf(root, diagnostics) : null;

    public PartDocument? Part(DiagnosticBag diagnostics)
    {
        var found = new DiagnosticBag();
        PartDocument? part = PartAt(_topPath, named: null, found);
        if (part is not null)
        {
            CheckFiles(PartFiles(part), found);
        }

        diagnostics.AddRange(PlaceOrder.Of(found.Items));
        return found.HasErrors ? null : part;
    }

    public AssemblyDocument? Assembly(DiagnosticBag diagnostics)
    {
        var found = new DiagnosticBag();
        AssemblyDocument? assembly = BindAssembly(found);
        if (assembly is not null)
        {
            var inParts = new DiagnosticBag();
            assembly = WithForces(WithParts(assembly, inParts), inParts);
            new AssemblyReferences(assembly, found).Check();
            found.AddRange(inParts.Items);
        }

        if (assembly is not null && !found.HasErrors)
        {
            CheckFiles(AssemblyFiles(assembly), found);
        }

        diagnostics.AddRange(PlaceOrder.Of(found.Items));
        return found.HasErrors ? null : assembly;
    }

    public BenchDocument? Bench(DiagnosticBag diagnostics)
    {
        var found = new DiagnosticBag();
        BenchDocument? bench = BindBench(found);
        if (bench is not null)
        {
            new BenchReferences(bench, found).Check();
        }

        if (bench is not null && !found.HasErrors)
        {
            CheckFiles(BenchFiles(bench), found);
        }

        diagnostics.AddRange(PlaceOrder.Of(found.Items));
        return found.HasErrors ? null : bench;
    }

    public ForcesDocument? Forces(DiagnosticBag diagnostics)
    {
        var found = new DiagnosticBag();
        ForcesDocument? forces = BindForces(_topPath, named: null, found);
        if (forces is not null)
        {
            CheckFiles(forces.Operations.Select(operation => operation.File), found);
        }

        diagnostics.AddRange(PlaceOrder.Of(found.Items));
        return found.HasErrors ? null : forces;
    }

    public PinsDocument? Pins(DiagnosticBag diagnostics)
    {
        var found = new DiagnosticBag();
        PinsDocument? pins = null;
        if (_reader.Read(_topPath, named: null, found) is YamlMap root && DocumentHeader.Is(root, DocumentKind.Pins, found))
        {
            new ShapeValidator(found).Validate(root, PinsShape.Root);
            pins = found.HasErrors ? null : new PinsBinder(found).Bind(root);
        }

        diagnostics.AddRange(PlaceOrder.Of(found.Items));
        return found.HasErrors ? null : pins;
    }

    private BenchDocument? BindBench(DiagnosticBag found)
    {
        if (_reader.Read(_topPath, named: null, found) is not YamlMap root || !DocumentHeader.Is(root, DocumentKind.Bench, found))
        {
            return null;
        }

        new ShapeValidator(found).Validate(root, BenchShape.Root);
        BenchDocument? bench = found.HasErrors ? null : new BenchBinder(found).Bind(root);
        return found.HasErrors ? null : bench;
    }

    private PartDocument? PartAt(string path, FileReference? named, DiagnosticBag found)
    {
        if (_reader.Read(path, named, found) is not YamlMap root || !DocumentHeader.Is(root, DocumentKind.Part, found))
        {
            return null;
        }

        new ShapeValidator(found).Validate(root, PartShape.Root);
        PartDocument? part = found.HasErrors ? null : new PartBinder(found).Bind(root);
        if (part is not null && !found.HasErrors)
        {
            PartReferences.Check(part, found);
        }

        return found.HasErrors ? null : part;
    }

    private AssemblyDocument? BindAssembly(DiagnosticBag found)
    {
        if (_overlays.Read(_topPath, DocumentKind.Assembly, found) is not OverlaidRoot overlaid)
        {
            return null;
        }

        new ShapeValidator(found).Validate(overlaid.Root, AssemblyShape.Root);
        AssemblyDocument? assembly = found.HasErrors ? null : new AssemblyBinder(found).Bind(overlaid.Root, overlaid.Bases);
        return found.HasErrors ? null : assembly;
    }

    /// <summary>Loads the part files, each once; a part whose file has errors stays without a document.</summary>
    private AssemblyDocument WithParts(AssemblyDocument assembly, DiagnosticBag inParts)
    {
        var loaded = new Dictionary<string, PartDocument?>(StringComparer.Ordinal);
        foreach (PlacedPartDocument placed in assembly.Parts.DistinctBy(placed => placed.File.FullPath))
        {
            var found = new DiagnosticBag();
            loaded[placed.File.FullPath] = PartAt(placed.File.FullPath, placed.File, found);
            inParts.AddRange(found.Items);
        }

        return assembly with { Parts = [.. assembly.Parts.Select(placed => placed with { Document = loaded[placed.File.FullPath] })] };
    }

    /// <summary>Loads the handovers that operations name instead of force files.</summary>
    private AssemblyDocument WithForces(AssemblyDocument assembly, DiagnosticBag inForces) => assembly with
    {
        Operations = [.. assembly.Operations.Select(operation => operation with
        {
            Forces = [.. operation.Forces.Select(force => IsHandover(force) ? force with { Handover = ForcesAt(force.File, inForces) } : force)],
        })],
    };

    private static bool IsHandover(ForceDocument force) => Path.GetExtension(force.File.FullPath) is ".yaml" or ".yml";

    private ForcesDocument? ForcesAt(FileReference named, DiagnosticBag diagnostics)
    {
        var found = new DiagnosticBag();
        ForcesDocument? forces = BindForces(named.FullPath, named, found);
        diagnostics.AddRange(found.Items);
        return forces;
    }

    private ForcesDocument? BindForces(string path, FileReference? named, DiagnosticBag found)
    {
        if (_reader.Read(path, named, found) is not YamlMap root || !DocumentHeader.Is(root, DocumentKind.Forces, found))
        {
            return null;
        }

        new ShapeValidator(found).Validate(root, ForcesShape.Root);
        ForcesDocument? forces = found.HasErrors ? null : new ForcesBinder(found).Bind(root);
        return found.HasErrors ? null : forces;
    }

    private void CheckFiles(IEnumerable<FileReference> files, DiagnosticBag found)
    {
        foreach (FileReference file in files)
        {
            _guard.CheckData(file, found);
        }
    }

    private static IEnumerable<FileReference> PartFiles(PartDocument part) =>
        part.Model is FrfModelDocument frf ? frf.Files.Select(file => file.File) : [];

    private static IEnumerable<FileReference> AssemblyFiles(AssemblyDocument assembly) =>
        assembly.Parts.DistinctBy(placed => placed.File.FullPath).SelectMany(placed => PartFiles(placed.Document!))
            .Concat(assembly.Mounts.Select(mount => mount.Law).OfType<TableLawDocument>().Select(law => law.File))
            .Concat(assembly.Operations.SelectMany(operation => operation.Forces).Select(force => force.DataFile));

    private static IEnumerable<FileReference> BenchFiles(BenchDocument bench) =>
        bench.InstalledFrfs.Select(file => file.Frf.File)
            .Concat(bench.InstalledFrfs.Select(file => file.Coherence).OfType<FileReference>())
            .Concat(bench.Operations.SelectMany(operation => operation.Files))
            .Concat(bench.Second?.InstalledFrfs.Select(file => file.File) ?? [])
            .Concat(bench.Second?.Operations.SelectMany(operation => operation.Files) ?? [])
            .Concat(bench.Model is null ? [] : [bench.Model.Assembly])
            .Concat(bench.Routes.Select(route => route.SourcePart).OfType<FileReference>())
            .Concat(bench.Routes.SelectMany(route => route.Operations).SelectMany(operation => operation.Files));
}
