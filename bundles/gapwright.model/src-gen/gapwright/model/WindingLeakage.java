/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Winding Leakage</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Leakage inductance of two windings from the energy of the field between them, ampere-turns opposed.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.WindingLeakage#getFirst <em>First</em>}</li>
 *   <li>{@link gapwright.model.WindingLeakage#getSecond <em>Second</em>}</li>
 *   <li>{@link gapwright.model.WindingLeakage#getArrangement <em>Arrangement</em>}</li>
 *   <li>{@link gapwright.model.WindingLeakage#getFirstBuild <em>First Build</em>}</li>
 *   <li>{@link gapwright.model.WindingLeakage#getSecondBuild <em>Second Build</em>}</li>
 *   <li>{@link gapwright.model.WindingLeakage#getSeparation <em>Separation</em>}</li>
 *   <li>{@link gapwright.model.WindingLeakage#getHeight <em>Height</em>}</li>
 *   <li>{@link gapwright.model.WindingLeakage#getMeanTurn <em>Mean Turn</em>}</li>
 *   <li>{@link gapwright.model.WindingLeakage#getInterfaces <em>Interfaces</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getWindingLeakage()
 * @model
 * @generated
 */
public interface WindingLeakage extends Element {
	/**
	 * Returns the value of the '<em><b>First</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The leakage inductance is referred to its turns.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>First</em>' reference.
	 * @see #setFirst(Winding)
	 * @see gapwright.model.GapwrightPackage#getWindingLeakage_First()
	 * @model resolveProxies="false" required="true"
	 * @generated
	 */
	Winding getFirst();

	/**
	 * Sets the value of the '{@link gapwright.model.WindingLeakage#getFirst <em>First</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>First</em>' reference.
	 * @see #getFirst()
	 * @generated
	 */
	void setFirst(Winding value);

	/**
	 * Returns the value of the '<em><b>Second</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Second</em>' reference.
	 * @see #setSecond(Winding)
	 * @see gapwright.model.GapwrightPackage#getWindingLeakage_Second()
	 * @model resolveProxies="false" required="true"
	 * @generated
	 */
	Winding getSecond();

	/**
	 * Sets the value of the '{@link gapwright.model.WindingLeakage#getSecond <em>Second</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Second</em>' reference.
	 * @see #getSecond()
	 * @generated
	 */
	void setSecond(Winding value);

	/**
	 * Returns the value of the '<em><b>Arrangement</b></em>' attribute.
	 * The literals are from the enumeration {@link gapwright.model.WindingArrangement}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * How the two lie in the window.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Arrangement</em>' attribute.
	 * @see gapwright.model.WindingArrangement
	 * @see #setArrangement(WindingArrangement)
	 * @see gapwright.model.GapwrightPackage#getWindingLeakage_Arrangement()
	 * @model
	 * @generated
	 */
	WindingArrangement getArrangement();

	/**
	 * Sets the value of the '{@link gapwright.model.WindingLeakage#getArrangement <em>Arrangement</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Arrangement</em>' attribute.
	 * @see gapwright.model.WindingArrangement
	 * @see #getArrangement()
	 * @generated
	 */
	void setArrangement(WindingArrangement value);

	/**
	 * Returns the value of the '<em><b>First Build</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Thickness of the first winding in the direction from one winding to the other.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>First Build</em>' attribute.
	 * @see #setFirstBuild(Quantity)
	 * @see gapwright.model.GapwrightPackage#getWindingLeakage_FirstBuild()
	 * @model dataType="gapwright.model.Length" required="true"
	 * @generated
	 */
	Quantity getFirstBuild();

	/**
	 * Sets the value of the '{@link gapwright.model.WindingLeakage#getFirstBuild <em>First Build</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>First Build</em>' attribute.
	 * @see #getFirstBuild()
	 * @generated
	 */
	void setFirstBuild(Quantity value);

	/**
	 * Returns the value of the '<em><b>Second Build</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Thickness of the second winding, likewise.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Second Build</em>' attribute.
	 * @see #setSecondBuild(Quantity)
	 * @see gapwright.model.GapwrightPackage#getWindingLeakage_SecondBuild()
	 * @model dataType="gapwright.model.Length" required="true"
	 * @generated
	 */
	Quantity getSecondBuild();

	/**
	 * Sets the value of the '{@link gapwright.model.WindingLeakage#getSecondBuild <em>Second Build</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Second Build</em>' attribute.
	 * @see #getSecondBuild()
	 * @generated
	 */
	void setSecondBuild(Quantity value);

	/**
	 * Returns the value of the '<em><b>Separation</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Insulation between the two.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Separation</em>' attribute.
	 * @see #setSeparation(Quantity)
	 * @see gapwright.model.GapwrightPackage#getWindingLeakage_Separation()
	 * @model dataType="gapwright.model.Length" required="true"
	 * @generated
	 */
	Quantity getSeparation();

	/**
	 * Sets the value of the '{@link gapwright.model.WindingLeakage#getSeparation <em>Separation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Separation</em>' attribute.
	 * @see #getSeparation()
	 * @generated
	 */
	void setSeparation(Quantity value);

	/**
	 * Returns the value of the '<em><b>Height</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Extent of the windings along the interface: along the leg when concentric, across it when side by side.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Height</em>' attribute.
	 * @see #setHeight(Quantity)
	 * @see gapwright.model.GapwrightPackage#getWindingLeakage_Height()
	 * @model dataType="gapwright.model.Length" required="true"
	 * @generated
	 */
	Quantity getHeight();

	/**
	 * Sets the value of the '{@link gapwright.model.WindingLeakage#getHeight <em>Height</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Height</em>' attribute.
	 * @see #getHeight()
	 * @generated
	 */
	void setHeight(Quantity value);

	/**
	 * Returns the value of the '<em><b>Mean Turn</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Mean length of a turn over both.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Mean Turn</em>' attribute.
	 * @see #setMeanTurn(Quantity)
	 * @see gapwright.model.GapwrightPackage#getWindingLeakage_MeanTurn()
	 * @model dataType="gapwright.model.Length" required="true"
	 * @generated
	 */
	Quantity getMeanTurn();

	/**
	 * Sets the value of the '{@link gapwright.model.WindingLeakage#getMeanTurn <em>Mean Turn</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Mean Turn</em>' attribute.
	 * @see #getMeanTurn()
	 * @generated
	 */
	void setMeanTurn(Quantity value);

	/**
	 * Returns the value of the '<em><b>Interfaces</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Number of interfaces between the two when they are interleaved.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Interfaces</em>' attribute.
	 * @see #setInterfaces(int)
	 * @see gapwright.model.GapwrightPackage#getWindingLeakage_Interfaces()
	 * @model default="1"
	 * @generated
	 */
	int getInterfaces();

	/**
	 * Sets the value of the '{@link gapwright.model.WindingLeakage#getInterfaces <em>Interfaces</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Interfaces</em>' attribute.
	 * @see #getInterfaces()
	 * @generated
	 */
	void setInterfaces(int value);

} // WindingLeakage
