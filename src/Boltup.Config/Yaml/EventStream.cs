using System.Diagnostics.CodeAnalysis;
using YamlDotNet.Core;
using YamlDotNet.Core.Events;

namespace Boltup.Config.Yaml;

/// <summary>The events of a document, where a failure of the parser, of whatever type, is data.</summary>
internal sealed class EventStream(string text)
{
    private readonly Parser _parser = new(new StringReader(text));

    /// <summary>The event under the cursor; null before the first, after the last and after a failure.</summary>
    public ParsingEvent? Current { get; private set; }

    public ParserFailure? Failure { get; private set; }

    /// <summary>Moves on; false at the end or at a failure.</summary>
    [SuppressMessage("Design", "CA1031", Justification = "malformed text draws exceptions of several types from the parser")]
    public bool Move()
    {
        if (Failure is not null)
        {
            return false;
        }

        ParsingEvent? last = Current;
        try
        {
            Current = _parser.MoveNext() ? _parser.Current : null;
        }
        catch (YamlException e)
        {
            Failure = new ParserFailure(e.Message, e.Start, e.End);
            Current = null;
        }
        catch (Exception e) when (e is not OutOfMemoryException)
        {
            Failure = new ParserFailure(null, last?.End ?? Mark.Empty, last?.End ?? Mark.Empty);
            Current = null;
        }

        return Current is not null;
    }
}
