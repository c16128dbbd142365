using System.CommandLine;
using Boltup.Cli.Terminal;
using Boltup.Config;
using Boltup.Config.Schema;

namespace Boltup.Cli.Commands;

/// <summary><c>boltup schema</c>: the JSON Schema of a document kind, from the definitions that validate it.</summary>
internal static class SchemaCommand
{
    public static Command Build(Screen screen)
    {
        var kind = new Argument<DocumentKind>("KIND") { Description = "part, assembly, bench, forces or pins", HelpName = "part|assembly|bench|forces|pins" };
        var command = new Command("schema", "Print the JSON Schema of a document kind, for editors.\n\nExample: boltup schema assembly > assembly.schema.json")
        {
            kind,
        };
        command.SetAction(parsed =>
        {
            screen.Out.WriteLine(JsonSchema.Of(parsed.GetValue(kind)).TrimEnd());
            return ExitCode.Done;
        });
        return command;
    }
}
